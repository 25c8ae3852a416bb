import { numberText } from '../../format/number-text.js'
import { atSentenceStart, levelNames } from '../level-names.js'
import type { LabelRoom } from '../label-room.js'
import { levelMark, levelMarkText } from '../marks/level-mark.js'
import { pens } from '../pens.js'
import { polyline } from '../shape-makers.js'
import type { Shape, Stroke, View } from '../shapes.js'
import type { SheetModel } from '../sheet-model.js'
import { textBox } from '../text-box.js'
import { toPaper } from '../view.js'

interface WaterLevel {
  label: string
  elevationFt: number
  fromStationFt: number
  stroke: Stroke
}

export function waterLevels(model: SheetModel): WaterLevel[] {
  const { site, profile } = model
  const low = site.lowWaterElevationFt ?? site.fullPoolElevationFt - (site.drawdownFt ?? 4)
  const names = levelNames[site.body]
  const level = (label: string, elevationFt: number, fromStationFt: number | undefined, stroke: Stroke) =>
    fromStationFt === undefined
      ? []
      : [{ label: `${label} ${numberText(elevationFt, 2)}`, elevationFt, fromStationFt, stroke }]
  return [
    ...level(
      atSentenceStart(names.high),
      site.fullPoolElevationFt,
      profile.fullPoolEdgeStationFt,
      pens.fullPool,
    ),
    ...level('While building', site.waterSurfaceTodayFt, profile.waterTodayEdgeStationFt, pens.waterToday),
    ...level(atSentenceStart(names.low), low, profile.lowWaterEdgeStationFt, pens.lowWater),
  ]
}

/** Each water level as a line from the finished surface to the end of the view, with its mark and elevation. */
export function profileLevels(model: SheetModel, view: View, room: LabelRoom): Shape[] {
  return waterLevels(model).flatMap((level) => {
    const start = toPaper(view, { x: level.fromStationFt, y: level.elevationFt })
    if (start.x > view.clip.right || start.y > view.clip.bottom || start.y < view.clip.top) return []
    const end = { x: view.clip.right, y: start.y }
    const places = [0, 6, 30, 36, 60, 66, 90].map((shift) => ({
      at: { x: view.clip.right - 5 - shift, y: start.y },
      text: levelMarkText({ x: view.clip.right - 5 - shift, y: start.y }, level.label),
    }))
    const inWater = places.filter(({ text }) => textBox(text).left > start.x + 2)
    const place = room.firstFree(inWater)
    const line = polyline([start, end], level.stroke, `level-${level.label.split(' ')[0]}`)
    if (!place) return [line]
    const ground = level.elevationFt === model.site.fullPoolElevationFt ? 'paper' : 'waterTint'
    const mark = levelMark({ at: place.at, label: level.label, ground })
    room.take(mark)
    return [line, ...mark]
  })
}
