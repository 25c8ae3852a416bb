import { interpolateGround } from '../survey/interpolate-ground.js'
import type { GroundPoint } from '../survey/resolve-ground-line.js'
import { finishedAt } from './finished-at.js'
import type { Stretch } from './stretches.js'

interface SectionStationsInput {
  stretch: Stretch
  groundLine: readonly GroundPoint[]
  waterSurfaceFt: number
  /** Stations of the stake-out: origin + k · interval. Infinity leaves only the breaks. */
  intervalFt: number
  originFt: number
}

/** Two stations nearer than this are one section. */
const SAME_FT = 1e-6
/** Two lines nearer than this touch and do not cross. */
const TOUCH_FT = 1e-9

/**
 * Stations of a stretch's sections: both ends, the interval, every break of the ground, and wherever ground and
 * formation cross, either of them meets the water, or the ground meets the finished surface. Between them every area
 * is a plain quadratic, so the prismoidal figure is exact.
 */
export function sectionStations(input: SectionStationsInput): number[] {
  const { stretch, groundLine } = input
  const { fromFt, toFt } = stretch
  const breaks = groundLine
    .map(({ stationFt }) => stationFt)
    .filter((station) => station > fromFt && station < toFt)
  const ends = [fromFt, ...breaks, toFt]
  const crossings = ends
    .slice(1)
    .flatMap((right, index) => crossingsBetween(input, ends[index] ?? fromFt, right))
  const sorted = [...ends, ...crossings, ...onInterval(input)].sort((a, b) => a - b)
  const distinct = sorted.filter(
    (station, index) => index === 0 || station - (sorted[index - 1] ?? 0) > SAME_FT,
  )
  // Of two stations closer than a hair the end itself must stay.
  if (distinct.length > 1) distinct[distinct.length - 1] = toFt
  return distinct
}

function crossingsBetween(input: SectionStationsInput, left: number, right: number): number[] {
  const [a, b] = [gaps(input, left), gaps(input, right)]
  return a.flatMap((gapLeft, index) => {
    const gapRight = b[index] ?? 0
    if (Math.abs(gapLeft) < TOUCH_FT || Math.abs(gapRight) < TOUCH_FT || gapLeft * gapRight > 0) return []
    return [left + ((right - left) * gapLeft) / (gapLeft - gapRight)]
  })
}

/** Differences whose change of sign is a break of some area. */
function gaps({ stretch, groundLine, waterSurfaceFt }: SectionStationsInput, stationFt: number): number[] {
  const ground = interpolateGround(groundLine, stationFt)
  const finished = finishedAt(stretch, stationFt)
  const formation = finished - stretch.rockFt
  const water = Number.isFinite(waterSurfaceFt) ? [ground - waterSurfaceFt, formation - waterSurfaceFt] : []
  return [ground - formation, ground - finished, ...water]
}

function onInterval({ stretch, intervalFt, originFt }: SectionStationsInput): number[] {
  if (!Number.isFinite(intervalFt)) return []
  const first = Math.ceil((stretch.fromFt - originFt) / intervalFt)
  const last = Math.floor((stretch.toFt - originFt) / intervalFt)
  return Array.from(
    { length: Math.max(0, last - first + 1) },
    (_, index) => originFt + (first + index) * intervalFt,
  ).filter((station) => station > stretch.fromFt && station < stretch.toFt)
}
