import { interpolateGround } from '../survey/interpolate-ground.js'
import type { GroundPoint } from '../survey/resolve-ground-line.js'

interface MeetGroundInput {
  groundLine: readonly GroundPoint[]
  from: GroundPoint
  /** Rise of the earth face for each foot walked away from `from`; negative falls. */
  risePerFt: number
  toward: 'water' | 'land'
}

export type GroundMeeting =
  | { meets: true; stationFt: number }
  /** `neededStationFt` is where they would meet if the last ground slope went on; absent when they never would. */
  | { meets: false; neededStationFt?: number }

/** Where an earth face that leaves `from` comes out of the ground again. */
export function meetGround({ groundLine, from, risePerFt, toward }: MeetGroundInput): GroundMeeting {
  const sign = toward === 'water' ? 1 : -1
  const beyond = groundLine.filter(({ stationFt }) => (stationFt - from.stationFt) * sign > 1e-9)
  const path = [
    { stationFt: from.stationFt, elevationFt: interpolateGround(groundLine, from.stationFt) },
    ...(sign > 0 ? beyond : beyond.reverse()),
  ].map(({ stationFt, elevationFt }) => {
    const walkedFt = (stationFt - from.stationFt) * sign
    return { walkedFt, gapFt: elevationFt - (from.elevationFt + risePerFt * walkedFt) }
  })
  const start = path[0]?.gapFt ?? 0
  for (let index = 1; index < path.length; index += 1) {
    const [before, after] = [path[index - 1], path[index]]
    if (before === undefined || after === undefined || after.gapFt * start > 0) continue
    const share = before.gapFt / (before.gapFt - after.gapFt)
    return {
      meets: true,
      stationFt: from.stationFt + sign * (before.walkedFt + share * (after.walkedFt - before.walkedFt)),
    }
  }
  return beyondSurvey({ groundLine, from, risePerFt, sign })
}

function beyondSurvey(given: Omit<MeetGroundInput, 'toward'> & { sign: number }): GroundMeeting {
  const { groundLine, from, risePerFt, sign } = given
  const [last, inner] = sign > 0 ? [groundLine.at(-1), groundLine.at(-2)] : [groundLine[0], groundLine[1]]
  if (last === undefined || inner === undefined) return { meets: false }
  const groundRisePerFt = (last.elevationFt - inner.elevationFt) / Math.abs(last.stationFt - inner.stationFt)
  const lastWalkedFt = (last.stationFt - from.stationFt) * sign
  const gapFt = last.elevationFt - (from.elevationFt + risePerFt * lastWalkedFt)
  const closing = risePerFt - groundRisePerFt
  const moreFt = gapFt / closing
  if (!Number.isFinite(moreFt) || moreFt <= 0) return { meets: false }
  return { meets: false, neededStationFt: last.stationFt + sign * moreFt }
}
