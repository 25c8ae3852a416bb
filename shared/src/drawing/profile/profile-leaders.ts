import { feetAndInches } from '../../format/feet-and-inches.js'
import { numberText } from '../../format/number-text.js'
import { ringOf } from '../geometry/boxes.js'
import type { LabelRoom } from '../label-room.js'
import { levelAt } from '../level-at.js'
import { leader, leaderLine } from '../marks/leader.js'
import { besideText, type Side } from '../marks/place-names.js'
import { typeMm } from '../pens.js'
import type { Point, Shape, TextShape, View } from '../shapes.js'
import type { SheetModel } from '../sheet-model.js'
import { textBox } from '../text-box.js'
import { toGround, toPaper } from '../view.js'
import { plumbFactor } from './profile-rock.js'
import { bermOutline, solidLine } from './solid-line.js'

type Ground = 'earthTint' | 'paper'

interface Name {
  target: Point
  text: string
  ground: Ground
}

const CLEAR_MM = 2.2

/** Names the parts: rock and fabric from below, where the hill is plain; the rest from the air. */
export function profileLeaders(model: SheetModel, view: View, room: LabelRoom): Shape[] {
  return [...namesBelow(model, view), ...namesAbove(model, view)].flatMap((name) => {
    const place = room.firstFree(
      candidates(name).filter(
        ({ text, side }) =>
          liesIn(name.ground, text, model, view) && room.isLineFree(leaderLine(name.target, text.at, side)),
      ),
    )
    if (!place) return []
    const shapes = leader({ ...name, at: place.text.at, side: place.side, sizeMm: typeMm.small })
    room.take(shapes)
    room.takeLine(leaderLine(name.target, place.text.at, place.side))
    return shapes
  })
}

function namesBelow(model: SheetModel, view: View): Name[] {
  const { profile, layers, fabric, earthwork } = model
  const plumb = plumbFactor(model)
  const on = (station: number, depthFt: number) => ({
    x: station,
    y: levelAt(profile.surface, station) - depthFt * plumb,
  })
  const name = (ground: Point, text: string): Name => ({
    target: toPaper(view, ground),
    text,
    ground: 'earthTint',
  })
  const along = (share: number) => profile.topStationFt + profile.runFt * share
  const stones = layers.map((layer, index) =>
    name(
      on(along(0.12 + index * 0.09), (layer.topFt + layer.bottomFt) / 2),
      `${layer.name}, ${numberText(layer.thicknessIn)} in thick`,
    ),
  )
  const cloth = fabric
    ? [name(on(along(0.34), layers.at(-1)?.bottomFt ?? 0), `fabric, ${fabric.plan.product}`)]
    : []
  const filled = (earthwork?.sections ?? []).filter(({ fillAreaFt2 }) => fillAreaFt2 > 0.5)
  const inFill = filled[Math.floor(filled.length / 2)]
  const fillAt = inFill && { x: inFill.stationFt, y: (inFill.formationFt + inFill.groundFt) / 2 }
  const fill = fillAt ? [name(fillAt, 'fill under the rock')] : []
  // From left to right, so that the strokes to the labels never cross.
  return [...stones, ...cloth, ...fill].sort((a, b) => a.target.x - b.target.x)
}

function namesAbove(model: SheetModel, view: View): Name[] {
  const { profile, berm, closing, site } = model
  const name = (ground: Point, text: string): Name => ({
    target: toPaper(view, ground),
    text,
    ground: 'paper',
  })
  const crest = bermOutline(model)[1]
  const bermName =
    berm && crest ? [name(crest, `berm, built ${feetAndInches(berm.value.builtHeightFt)} high`)] : []
  const panelTop = closing && {
    x: closing.stationFt,
    y: site.fullPoolElevationFt + closing.plan.aboveWaterFt,
  }
  const panel = panelTop ? [name(panelTop, 'closing panel, no current')] : []
  const highest = model.ground
    .filter((p) => p.stationFt >= profile.topStationFt && p.stationFt <= profile.toeStationFt)
    .map((p) => ({ x: p.stationFt, y: p.elevationFt }))
    .find((p) => p.y > levelAt(profile.surface, p.x) + 0.15)
  const existing = highest ?? {
    x: profile.topStationFt - 2,
    y: levelAt(model.ground, profile.topStationFt - 2),
  }
  return [...bermName, name(existing, 'existing ground'), ...panel]
}

const BELOW = { across: [12, 18, 26, 8, 36, 48, 60], down: [7, 11, 15, 19, 23, 28, 34, 40, 47] }
const ABOVE = { across: [8, 12, 18, 5, 26], down: [-5, -8, -12, -16, -3, -20, -26] }

/** Places to try, near ones first: to the left below for things in the hill, in the air on either side. */
function candidates({ target, text, ground }: Name): { text: TextShape; side: Side }[] {
  const isBelow = ground === 'earthTint'
  const { across, down } = isBelow ? BELOW : ABOVE
  const sides: Side[] = isBelow ? ['left'] : ['right', 'left']
  return down.flatMap((dy) =>
    sides.flatMap((side) => across.map((dx) => ({ side, text: besideText(target, text, side, { dx, dy }) }))),
  )
}

/** A label of the hill lies wholly under the rock or ground, a label of the air wholly above ground and water. */
function liesIn(ground: Ground, text: TextShape, model: SheetModel, view: View): boolean {
  const solid = solidLine(model).map((p) => ({ stationFt: p.x, elevationFt: p.y }))
  const rock = (model.layers.at(-1)?.bottomFt ?? 0) * plumbFactor(model) * view.verticalMmPerFt
  return ringOf(textBox(text)).every((corner) => {
    const station = toGround(view, corner).x
    const line = toPaper(view, { x: station, y: levelAt(solid, station) }).y
    if (ground === 'earthTint') return corner.y > line + CLEAR_MM + (isOnRock(model, station) ? rock : 0)
    const water = toPaper(view, { x: 0, y: model.site.fullPoolElevationFt }).y
    const isWet = station > model.profile.fullPoolEdgeStationFt
    return corner.y < Math.min(line, isWet ? water : Infinity) - 1
  })
}

const isOnRock = (model: SheetModel, stationFt: number) =>
  stationFt > (model.pad?.fromStationFt ?? model.profile.topStationFt) - 1 &&
  stationFt < model.profile.toeStationFt + 1
