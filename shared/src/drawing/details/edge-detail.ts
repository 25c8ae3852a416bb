import { feetAndInches } from '../../format/feet-and-inches.js'
import { formatRatio } from '../../format/format-ratio.js'
import { numberText } from '../../format/number-text.js'
import { earthHatch } from '../hatches/earth-hatch.js'
import { stoneHatch, stoneOnPaperMm } from '../hatches/stone-hatch.js'
import { labelRoom } from '../label-room.js'
import { dimension } from '../marks/dimension.js'
import { placeNames, type Name } from '../marks/place-names.js'
import { pens } from '../pens.js'
import { polygon, polyline } from '../shape-makers.js'
import type { Box, Point, Shape, View } from '../shapes.js'
import type { SheetModel } from '../sheet-model.js'
import { lineToPaper, makeView, toPaper } from '../view.js'

const BODY_FT = 3.2
const EARTH_BELOW_FT = 0.9

/** Measures of the rock's right edge in a cut, square to the slope, in feet from the center line. */
interface Edge {
  left: number
  half: number
  foot: number
  rim: number
  far: number
  thickness: number
  at: (depthFt: number) => number
}

function edgeOf(model: SheetModel): Edge {
  const thickness = model.layers.at(-1)?.bottomFt ?? 1
  const half = model.ramp.widthFt / 2
  const foot = (model.earthwork?.formationWidthFt ?? model.ramp.widthFt) / 2
  const rim = foot + (model.earthwork?.cutSideRunPerRise ?? 0) * thickness
  const at = (depthFt: number) => half + model.edgeRunPerRise * depthFt
  return { left: half - BODY_FT, half, foot, rim, far: rim + 1, thickness, at }
}

export function edgeDetailView(model: SheetModel, clip: Box): View {
  const edge = edgeOf(model)
  const window = { from: { x: edge.left, y: -edge.thickness - EARTH_BELOW_FT }, to: { x: edge.far, y: 1.1 } }
  return makeView({ key: 'edge-detail', title: 'Edge of the rock', clip, window })
}

/** Layers, fabric and the earth put back beside them. */
export function edgeDetail(model: SheetModel, view: View): Shape[] {
  const edge = edgeOf(model)
  const { left, foot, rim, far, thickness, half } = edge
  const hill = [
    { x: left, y: -thickness },
    { x: foot, y: -thickness },
    { x: rim, y: 0 },
    { x: far, y: 0 },
  ]
  const backfill = [{ x: edge.at(thickness), y: -thickness }, ...hill.slice(1, 3), { x: half, y: 0 }]
  const low = -thickness - EARTH_BELOW_FT
  const deep = [
    { x: far, y: low },
    { x: left, y: low },
  ]
  const under = lineToPaper(view, hill.slice(0, 2)).map(({ x, y }) => ({ x, y: y + 1 }))
  return [
    polygon(lineToPaper(view, [...hill, ...deep]), { fill: 'earthTint' }),
    earthHatch(under),
    earthHatch(
      lineToPaper(view, [
        { x: rim, y: 0 },
        { x: far, y: 0 },
      ]),
    ),
    polygon(lineToPaper(view, backfill), { fill: 'earthFill' }),
    ...layers(model, view, edge),
    ...fabric(model, view, edge),
    polyline(
      lineToPaper(view, [
        { x: left, y: 0 },
        { x: far, y: 0 },
      ]),
      pens.finished,
    ),
    ...marks(model, view, edge),
  ]
}

function layers(model: SheetModel, view: View, edge: Edge): Shape[] {
  return model.layers.flatMap((layer, index): Shape[] => {
    const ring = lineToPaper(view, [
      { x: edge.left, y: -layer.topFt },
      { x: edge.at(layer.topFt), y: -layer.topFt },
      { x: edge.at(layer.bottomFt), y: -layer.bottomFt },
      { x: edge.left, y: -layer.bottomFt },
    ])
    // Two rows of stone at least: one row alone leaves gaps that look like holes.
    const twoRowsMm = (layer.bottomFt - layer.topFt) * view.verticalMmPerFt * 0.48
    const stoneMm = Math.min(stoneOnPaperMm(layer.stoneSizeIn, view.horizontalMmPerFt), twoRowsMm)
    return [
      polygon(ring, { fill: layer.role === 'base' ? 'stoneDark' : 'stone' }),
      stoneHatch({ ring, stoneMm, slope: 0, seed: 20 + index }),
      polygon(ring, { stroke: pens.fine }),
    ]
  })
}

function fabric(model: SheetModel, view: View, edge: Edge): Shape[] {
  if (!model.fabric) return []
  const up = Math.min(model.fabric.plan.sideTurnUpFt, edge.thickness)
  const line: Point[] = [
    { x: edge.left, y: -edge.thickness },
    { x: edge.at(edge.thickness), y: -edge.thickness },
    { x: edge.at(edge.thickness - up) + 0.05, y: -edge.thickness + up },
  ]
  return [polyline(lineToPaper(view, line), pens.fabric)]
}

/** Clear of the finished surface, in steps upward. */
const ABOVE_MM = [5, 10, 15, 20]

function marks(model: SheetModel, view: View, edge: Edge): Shape[] {
  const at = (x: number, y: number) => toPaper(view, { x, y })
  const thicknesses = model.layers.flatMap((layer) => {
    const x = edge.left + 0.35
    return dimension({
      from: at(x, -layer.topFt),
      to: at(x, -layer.bottomFt),
      label: `${numberText(layer.thicknessIn)}″`,
    })
  })
  const surface = at(0, 0).y
  const aboveName = (target: Point, text: string, sides: Name['sides']): Name => ({
    target,
    text,
    sides,
    ground: 'paper',
    downMm: ABOVE_MM.map((mm) => surface - target.y - mm),
  })
  const stones = model.layers.map((layer, index) => {
    const target = at(edge.left + 1.2 + index * 0.7, -(layer.topFt + layer.bottomFt) / 2)
    return aboveName(target, `${layer.name}, ${numberText(layer.stoneSizeIn)} in`, ['right'])
  })
  const cut = `earth put back, cut ${formatRatio(model.earthwork?.cutSideRunPerRise ?? 0)}`
  const inCut = at(edge.foot + (edge.rim - edge.foot) * 0.45, -edge.thickness * 0.4)
  const side = aboveName(inCut, cut, ['right', 'left'])
  const turnUp = model.fabric ? `fabric, turned up ${feetAndInches(model.fabric.plan.sideTurnUpFt)}` : ''
  const cloth: Name = {
    target: at(edge.at(edge.thickness) - 0.6, -edge.thickness),
    text: turnUp,
    sides: ['right'],
    ground: 'earthTint',
    downMm: [6, 8],
  }
  const room = labelRoom(view.clip)
  room.take(thicknesses)
  const names = [
    ...[...stones].reverse(),
    ...(model.earthwork ? [side] : []),
    ...(model.fabric ? [cloth] : []),
  ]
  return [...thicknesses, ...placeNames(names, room)]
}
