import type { Point } from '../shapes.js'
import { levelAt } from '../level-at.js'
import type { SheetModel } from '../sheet-model.js'

const asPoint = (point: { stationFt: number; elevationFt: number }): Point => ({
  x: point.stationFt,
  y: point.elevationFt,
})

/** The ground's own line, as surveyed. */
export const existingLine = (model: SheetModel): Point[] => model.ground.map(asPoint)

/** The ramp's finished surface: rock from the top (or the landing before it) to the toe (or the apron past it). */
export const rockSurface = (model: SheetModel): Point[] =>
  model.profile.surface.filter(({ part }) => !['approach', 'nose', 'end-cut'].includes(part)).map(asPoint)

/** The whole finished surface with the earth approach before the rock. */
export const finishedLine = (model: SheetModel): Point[] => model.profile.surface.map(asPoint)

/** Past the toe the earth is shaped until it meets the bed: a nose where the toe stands proud, else an end cut. */
export const endLine = (model: SheetModel): Point[] =>
  (model.earthwork?.sections ?? [])
    .filter(({ part }) => part === 'nose' || part === 'end-cut')
    .map(({ stationFt, formationFt }) => ({ x: stationFt, y: formationFt }))

/** What stands when the work is done, without the berm: existing ground outside the work, finished inside. */
export function solidLine(model: SheetModel): Point[] {
  const work = [...finishedLine(model), ...endLine(model)]
  const from = work[0]?.x ?? 0
  const to = work.at(-1)?.x ?? 0
  const ground = existingLine(model)
  return [...ground.filter((p) => p.x < from), ...work, ...ground.filter((p) => p.x > to)]
}

/** The berm's outline on the existing ground, from its upslope foot over the crest to its downslope foot. */
export function bermOutline(model: SheetModel): Point[] {
  if (!model.berm) return []
  const { value, plan } = model.berm
  const crest = levelAt(model.ground, plan.crestStationFt) + value.builtHeightFt
  const half = plan.topWidthFt / 2
  const foot = (stationFt: number) => ({ x: stationFt, y: levelAt(model.ground, stationFt) })
  return [
    foot(plan.crestStationFt - half - value.upslopeReachFt),
    { x: plan.crestStationFt - half, y: crest },
    { x: plan.crestStationFt + half, y: crest },
    foot(plan.crestStationFt + half + value.downslopeReachFt),
  ]
}
