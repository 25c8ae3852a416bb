import type { Box, View } from '../shapes.js'
import { makeView } from '../view.js'
import type { SheetModel } from '../sheet-model.js'
import { bermOutline, endLine, existingLine, finishedLine } from './solid-line.js'

interface ProfileViewRequest {
  model: SheetModel
  clip: Box
  key: string
  title: string
  mostExaggeration: number
  scaleFtPerInch?: number
  /** Paper left free above the highest thing, for dimensions and names. */
  headroomMm?: number
}

/** Feet of room past the work on either side, below the deepest point and above the highest. */
const ROOM = { landwardFt: 6, waterwardFt: 14, belowFt: 1.5, aboveFt: 1 }

/** A window around the work, not the whole survey: a long approach would make the ramp a small thing. */
export function profileView({ model, clip, headroomMm = 0, ...rest }: ProfileViewRequest): View {
  const ground = existingLine(model)
  const work = [...finishedLine(model), ...endLine(model), ...bermOutline(model)]
  const workStations = [...work.map((p) => p.x), model.closing?.stationFt, model.pad?.fromStationFt].filter(
    (station) => station !== undefined,
  )
  const from = Math.max(ground[0]?.x ?? 0, Math.min(...workStations) - ROOM.landwardFt)
  const to = Math.min(ground.at(-1)?.x ?? 0, Math.max(...workStations) + ROOM.waterwardFt)
  const seen = [...work, ...ground.filter((p) => p.x >= from && p.x <= to)].map((p) => p.y)
  const thickness = model.layers.at(-1)?.bottomFt ?? 0
  const panelTop = model.closing
    ? model.site.fullPoolElevationFt + model.closing.plan.aboveWaterFt
    : -Infinity
  const bottom = Math.min(...seen, model.profile.toeElevationFt - thickness) - ROOM.belowFt
  const top = Math.max(...seen, panelTop) + ROOM.aboveFt
  const under = { ...clip, top: clip.top + headroomMm }
  const view = makeView({
    ...rest,
    clip: under,
    window: { from: { x: from, y: bottom }, to: { x: to, y: top } },
  })
  return withinSurvey({ ...view, clip }, ground)
}

/** Where the scale leaves room to spare, it is given to surveyed ground rather than to blank paper. */
function withinSurvey(view: View, ground: readonly { x: number }[]): View {
  const shownFt = (view.clip.right - view.clip.left) / view.horizontalMmPerFt
  const first = ground[0]?.x ?? 0
  const last = ground.at(-1)?.x ?? 0
  const wanted = view.originFt.x - shownFt / 2
  const from = Math.max(first, Math.min(wanted, last - shownFt))
  return { ...view, originFt: { ...view.originFt, x: from + shownFt / 2 } }
}
