import type { RampPart } from '../design/ramp-shapes.js'
import { interpolateGround } from '../survey/interpolate-ground.js'
import type { GroundPoint } from '../survey/resolve-ground-line.js'
import { finishedAt } from './finished-at.js'
import { meetGround } from './meet-ground.js'
import type { SurfacePoint } from './ramp-surface.js'
import { surveyReachError } from './survey-reach-error.js'

/** A piece of the earthwork whose finished surface is one straight line. */
export interface Stretch {
  part: RampPart
  fromFt: number
  toFt: number
  finishedAtFromFt: number
  /** Rise of the surface for each foot toward the water. */
  risePerFt: number
  /** Rock measured plumb, ft. */
  rockFt: number
}

export interface StretchesInput {
  groundLine: readonly GroundPoint[]
  surface: readonly SurfacePoint[]
  /** Rock measured square to the slope, ft. */
  rockThicknessFt: number
  cutSideRunPerRise: number
  fillSideRunPerRise: number
}

/** Less than this between formation and bed at the toe needs no end. */
const NO_END_FT = 1e-6

/** The surface piece by piece from land to water, and past its end the nose or the end cut. */
export function stretches(input: StretchesInput): Stretch[] {
  const pieces = input.surface.slice(0, -1).flatMap((from, index): Stretch[] => {
    const to = input.surface[index + 1]
    if (to === undefined || to.stationFt <= from.stationFt) return []
    const risePerFt = (to.elevationFt - from.elevationFt) / (to.stationFt - from.stationFt)
    const rockFt = from.part === 'approach' ? 0 : input.rockThicknessFt * Math.hypot(1, risePerFt)
    return [
      {
        part: from.part,
        fromFt: from.stationFt,
        toFt: to.stationFt,
        finishedAtFromFt: from.elevationFt,
        risePerFt,
        rockFt,
      },
    ]
  })
  const last = pieces.at(-1)
  return last === undefined ? pieces : [...pieces, ...waterEnd({ ...input, last })]
}

/**
 * Past the toe the formation goes on until it meets the bed: down at the fill side where it stands above the bed, up at
 * the cut side where it lies below. A vertical side needs no length.
 */
function waterEnd(input: StretchesInput & { last: Stretch }): Stretch[] {
  const { groundLine, last } = input
  const from = { stationFt: last.toFt, elevationFt: finishedAt(last, last.toFt) - last.rockFt }
  const depthFt = interpolateGround(groundLine, from.stationFt) - from.elevationFt
  const runPerRise = depthFt > 0 ? input.cutSideRunPerRise : input.fillSideRunPerRise
  if (Math.abs(depthFt) < NO_END_FT || runPerRise === 0) return []
  const risePerFt = Math.sign(depthFt) / runPerRise
  const meeting = meetGround({ groundLine, from, risePerFt, toward: 'water' })
  if (!meeting.meets) {
    const stationFt = groundLine.at(-1)?.stationFt ?? 0
    throw surveyReachError({ stationFt, neededStationFt: meeting.neededStationFt, toward: 'water' })
  }
  const part: RampPart = depthFt > 0 ? 'end-cut' : 'nose'
  return [
    {
      part,
      fromFt: from.stationFt,
      toFt: meeting.stationFt,
      finishedAtFromFt: from.elevationFt,
      risePerFt,
      rockFt: 0,
    },
  ]
}
