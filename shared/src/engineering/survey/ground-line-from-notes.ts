import { EngineeringInputError } from '../engineering-input-error.js'
import type { LevelPoint } from './reduce-level-notes.js'
import { type GroundPoint, resolveGroundLine } from './resolve-ground-line.js'

export interface GroundLineFromNotesInput {
  points: readonly LevelPoint[]
  /** Takes `adjustedElevationFt` where the notes were adjusted. */
  useAdjusted?: boolean
}

/**
 * Ground line of the reduced notes: every point that has a station, put in order of station, since the rod is often
 * carried back for a point that was missed.
 *
 * @param input.points points of reduceLevelNotes; elevations and stations in ft.
 * @param input.useAdjusted true takes the adjusted elevations (all points must then have one).
 * @returns points `{ stationFt, elevationFt }`, ft, ascending.
 * @throws EngineeringInputError naming `groundLine` when fewer than two points have a station or two share one.
 * @see common practice, no source.
 * @example groundLineFromNotes({ points: reduceLevelNotes(notes).points })
 */
export function groundLineFromNotes({
  points,
  useAdjusted = false,
}: GroundLineFromNotesInput): GroundPoint[] {
  const withStation = points.flatMap((point) => {
    if (point.stationFt === undefined) return []
    const elevationFt = useAdjusted ? point.adjustedElevationFt : point.elevationFt
    if (elevationFt === undefined) {
      throw new EngineeringInputError({
        field: 'useAdjusted',
        message: `Point "${point.label}" has no adjusted elevation; adjust the notes to a known closing elevation first.`,
      })
    }
    return [{ stationFt: point.stationFt, elevationFt }]
  })
  return resolveGroundLine({ groundLine: withStation.sort((a, b) => a.stationFt - b.stationFt) })
}
