import { feetAndInches } from '../../format/feet-and-inches.js'
import { formatRatio } from '../../format/format-ratio.js'
import { earthHatch } from '../hatches/earth-hatch.js'
import { waterHatch } from '../hatches/water-hatch.js'
import { backedText } from '../marks/backed-text.js'
import { dimension } from '../marks/dimension.js'
import { labelRoom } from '../label-room.js'
import { placeNames, type Name } from '../marks/place-names.js'
import { pens, typeMm } from '../pens.js'
import { polygon, polyline, textAt } from '../shape-makers.js'
import type { Box, Point, Shape, View } from '../shapes.js'
import type { SheetModel } from '../sheet-model.js'
import { lineToPaper, makeView, toPaper } from '../view.js'

type Berm = NonNullable<SheetModel['berm']>

/** Feet of hill shown beyond either foot of the berm. */
const BESIDE_FT = 3

/** The ground across the berm as a straight fall, zero under the crest's middle. */
const groundAt = (berm: Berm, x: number) => -berm.plan.groundFallFtPerFt * x

export function bermDetailView(berm: Berm, clip: Box): View {
  const half = berm.plan.topWidthFt / 2
  const from = -half - berm.value.upslopeReachFt - BESIDE_FT - channelReach(berm)
  const to = half + berm.value.downslopeReachFt + BESIDE_FT
  const window = {
    from: { x: from, y: groundAt(berm, to) - 0.8 },
    to: { x: to, y: berm.value.builtHeightFt + 2 },
  }
  return makeView({ key: 'berm-detail', title: 'Berm', clip, window, mostExaggeration: 2 })
}

/** How far the design flow spreads up a gentle hill; the view need not hold all of a very flat one. */
const channelReach = (berm: Berm) =>
  Math.min(6, berm.value.depthFt / Math.max(berm.plan.groundFallFtPerFt, 0.02) / 4)

/** Cross section of the berm as built, with the flow it carries and the room above it. */
export function bermDetail(berm: Berm, view: View): Shape[] {
  const half = berm.plan.topWidthFt / 2
  const { builtHeightFt, upslopeReachFt, downslopeReachFt } = berm.value
  const upFoot = { x: -half - upslopeReachFt, y: groundAt(berm, -half - upslopeReachFt) }
  const downFoot = { x: half + downslopeReachFt, y: groundAt(berm, half + downslopeReachFt) }
  const ridge = [upFoot, { x: -half, y: builtHeightFt }, { x: half, y: builtHeightFt }, downFoot]
  const hill = [-60, 60].map((x) => ({ x, y: groundAt(berm, x) }))
  const deep = [...hill].reverse().map(({ x, y }) => ({ x, y: y - 1.9 }))
  const paperHill = lineToPaper(view, [{ x: -60, y: groundAt(berm, -60) }, upFoot])
  return [
    polygon(lineToPaper(view, [...hill, ...deep]), { fill: 'earthTint' }),
    ...flow(berm, view, upFoot),
    polygon(lineToPaper(view, ridge), { fill: 'earthFill' }),
    earthHatch(paperHill),
    earthHatch(lineToPaper(view, [downFoot, { x: 60, y: groundAt(berm, 60) }])),
    polyline(lineToPaper(view, hill), pens.existing),
    polyline(lineToPaper(view, ridge), pens.finished),
    ...marks(berm, view),
  ]
}

/** The design flow standing against the settled ridge. */
function flow(berm: Berm, view: View, foot: Point): Shape[] {
  const level = foot.y + berm.value.depthFt
  const fall = Math.max(berm.plan.groundFallFtPerFt, 0.005)
  const ring = lineToPaper(view, [
    foot,
    { x: foot.x + berm.value.depthFt * berm.plan.upslopeRunPerRise, y: level },
    { x: foot.x - berm.value.depthFt / fall, y: level },
  ])
  return [polygon(ring, { fill: 'waterTint' }), waterHatch(ring)]
}

function marks(berm: Berm, view: View): Shape[] {
  const { plan, value } = berm
  const half = plan.topWidthFt / 2
  const at = (x: number, y: number) => toPaper(view, { x, y })
  const crest = at(0, value.builtHeightFt)
  const top = dimension({
    from: { x: at(-half, 0).x, y: crest.y - 7 },
    to: { x: at(half, 0).x, y: crest.y - 7 },
    label: `top ${feetAndInches(plan.topWidthFt)}`,
    witness: [at(-half, value.builtHeightFt), at(half, value.builtHeightFt)],
  })
  const rise: Shape = polyline([crest, at(0, 0)], pens.fine)
  const heightText = `${feetAndInches(value.builtHeightFt, 2)} built, ${feetAndInches(value.settledHeightFt, 2)} settled`
  const slope = (x: number, y: number, run: number, align: 'left' | 'right') => {
    const p = at(x, y)
    const dx = align === 'left' ? 2 : -2
    return backedText(
      textAt(formatRatio(run), { x: p.x + dx, y: p.y - 2 }, { align, sizeMm: typeMm.small }),
      'paper',
    )
  }
  const upMiddle = -half - value.upslopeReachFt * 0.35
  const downMiddle = half + value.downslopeReachFt * 0.5
  const foot = -half - value.upslopeReachFt
  const names: Name[] = [
    {
      target: at(foot - 0.6, groundAt(berm, foot) + value.depthFt * 0.7),
      text: `flow ${feetAndInches(value.depthFt, 2)} deep`,
      sides: ['left', 'right'],
      ground: 'paper',
      downMm: [-9, -13],
    },
    {
      target: at(0, value.builtHeightFt / 2),
      text: heightText,
      sides: ['right'],
      ground: 'earthTint',
      downMm: [11, 13, 15, 17],
    },
  ]
  const slopes = [
    ...slope(upMiddle, value.builtHeightFt * 0.72, plan.upslopeRunPerRise, 'right'),
    ...slope(downMiddle, value.builtHeightFt * 0.5, plan.downslopeRunPerRise, 'left'),
  ]
  const room = labelRoom(view.clip)
  room.take([...top, ...slopes])
  return [...top, rise, ...slopes, ...placeNames(names, room)]
}
