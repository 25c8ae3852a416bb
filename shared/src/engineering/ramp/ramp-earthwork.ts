import type { EarthSection, EarthVolumes, EarthworkValue } from '../design/ramp-shapes.js'
import { EngineeringInputError } from '../engineering-input-error.js'
import { requireNumber } from '../require-number.js'
import { type GroundPoint, type GroundPointInput, resolveGroundLine } from '../survey/resolve-ground-line.js'
import { type BalanceSettings, type EarthBalance, earthBalance } from './earth-balance.js'
import { earthworkTemplate, type EarthworkTemplateInput } from './earthwork-template.js'
import { addVolumes } from './add-volumes.js'
import { measureRamp } from './measure-ramp.js'
import type { MeasuredStretch } from './measure-stretch.js'
import type { SurfacePoint } from './ramp-surface.js'
import { type Stripping, stripping } from './stripping.js'
import { surveyReachError } from './survey-reach-error.js'

export interface RampEarthworkInput extends EarthworkTemplateInput, BalanceSettings {
  groundLine: readonly GroundPointInput[]
  /** Result of rampProfile. */
  profile: { surface: readonly SurfacePoint[] }
  stationIntervalFt: number
  /** Topsoil stripped over the dry footprint, in. */
  stripDepthIn?: number
}

export interface EarthEnd {
  part: 'approach' | 'nose' | 'end-cut'
  fromStationFt: number
  toStationFt: number
  averageEndArea: EarthVolumes
  prismoidal: EarthVolumes
}

export interface RampEarthwork extends EarthworkValue {
  /** `averageEndArea` and `prismoidal` are those of landing, ramp and apron; the ends stand beside them. */
  ends: EarthEnd[]
  /** Landing, ramp, apron and ends together. */
  total: { averageEndArea: EarthVolumes; prismoidal: EarthVolumes }
  stripping: Stripping
  /** From the prismoidal total. */
  balance: EarthBalance
}

/** Keeps a mistyped interval from drawing up a list nobody can read. */
const MOST_INTERVALS = 5000

/**
 * Earthwork of the ramp. Formation = finished − T/cos θ; B = width + 2·e·T + 2·allowance; with d = ground − formation
 * cut = B·d + s_c·d², fill = B·h + s_f·h² (h = −d). Sections stand at every interval from the ramp's top, every break,
 * and every crossing of ground, formation, finished surface and today's water. Volumes by average end area,
 * V = L(A1 + A2)/2 (the figure for pay), and by the prismoidal formula, V = L(A1 + 4Am + A2)/6 (exact here). Past the toe
 * the formation runs out to the bed as nose or end cut; cut below today's water is spoil.
 *
 * @param input.groundLine as for rampProfile; input.profile its result.
 * @param input.widthFt ft > 0; edgeAllowanceFt, edgeRunPerRise, rockThicknessIn, cutSideRunPerRise, fillSideRunPerRise
 *   ≥ 0; waterSurfaceTodayFt ft; stationIntervalFt ft > 0; stripDepthIn in ≥ 0.
 * @param input.swellPercent ≥ 0; shrinkPercent 0 to < 100; otherDryCutYd3 ≥ 0; spreadDepthIn in > 0 (district settings).
 * @returns formation width and plumb rock thickness (ft), sections (ft, ft²), volumes (yd³) of the ramp, of its ends and
 *   of all, topsoil, and the balance of earth (yd³).
 * @throws EngineeringInputError; `groundLine` with the station that the survey must reach when it is too short.
 * @see FHWA, HEC-22, Urban Drainage Design Manual, 4th ed., February 2024, eq. 10.12 (prismoidal); average end area and
 *   template: common practice. Ground is taken level across; edges are measured square to the slope.
 * @example rampEarthwork({ groundLine, profile, widthFt: 18, edgeAllowanceFt: 0, edgeRunPerRise: 1.5, rockThicknessIn: 12,
 *   cutSideRunPerRise: 3, fillSideRunPerRise: 3, stationIntervalFt: 10 }).formationWidthFt // 21
 */
export function rampEarthwork(input: RampEarthworkInput): RampEarthwork {
  const template = earthworkTemplate(input)
  const groundLine = resolveGroundLine({
    groundLine: input.groundLine,
    waterSurfaceFt: input.waterSurfaceTodayFt,
  })
  const surface = checkedSurface({ surface: input.profile?.surface, groundLine })
  const intervalFt = checkedInterval({ intervalFt: input.stationIntervalFt, surface })
  const stripDepthFt = requireNumber({ field: 'stripDepthIn', value: input.stripDepthIn ?? 0, min: 0 }) / 12
  const measured = measureRamp({ groundLine, surface, template, intervalFt })
  const sections = measured.flatMap((piece) => piece.sections)
  const body = measured.filter(({ stretch }) => !isEnd(stretch.part))
  const total = together(measured)
  const topsoil = stripping({ sections, stripDepthFt, template })
  const slope = measured.find(({ stretch }) => stretch.part === 'ramp')
  return {
    formationWidthFt: template.formationWidthFt,
    verticalRockThicknessFt: slope?.stretch.rockFt ?? template.rockThicknessFt,
    sections,
    ...together(body),
    ends: measured.flatMap(endOf),
    total,
    stripping: topsoil,
    balance: earthBalance({ ...input, volumes: total.prismoidal, stripping: topsoil }),
  }
}

function together(pieces: readonly MeasuredStretch[]) {
  return {
    averageEndArea: addVolumes(pieces.map(({ averageEndArea }) => averageEndArea)),
    prismoidal: addVolumes(pieces.map(({ prismoidal }) => prismoidal)),
  }
}

function isEnd(part: EarthSection['part']): part is EarthEnd['part'] {
  return part === 'approach' || part === 'nose' || part === 'end-cut'
}

function endOf({ stretch, averageEndArea, prismoidal }: MeasuredStretch): EarthEnd[] {
  const { part, fromFt, toFt } = stretch
  return isEnd(part) ? [{ part, fromStationFt: fromFt, toStationFt: toFt, averageEndArea, prismoidal }] : []
}

function checkedSurface(given: {
  surface: readonly SurfacePoint[] | undefined
  groundLine: readonly GroundPoint[]
}) {
  const { surface = [], groundLine } = given
  const [first, last] = [surface[0], surface.at(-1)]
  if (first === undefined || last === undefined || surface.length < 2) {
    throw new EngineeringInputError({
      field: 'profile',
      message: 'profile.surface needs at least two points.',
    })
  }
  surface.forEach(({ stationFt, elevationFt }, index) => {
    requireNumber({
      field: `profile.surface[${index}].stationFt`,
      value: stationFt,
      min: surface[index - 1]?.stationFt,
    })
    requireNumber({ field: `profile.surface[${index}].elevationFt`, value: elevationFt })
  })
  const begins = groundLine[0]?.stationFt ?? 0
  const ends = groundLine.at(-1)?.stationFt ?? 0
  if (first.stationFt < begins - 1e-9) {
    throw surveyReachError({ stationFt: begins, neededStationFt: first.stationFt, toward: 'land' })
  }
  if (last.stationFt > ends + 1e-9) {
    throw surveyReachError({ stationFt: ends, neededStationFt: last.stationFt, toward: 'water' })
  }
  return surface
}

function checkedInterval({
  intervalFt,
  surface,
}: {
  intervalFt: number
  surface: readonly SurfacePoint[]
}): number {
  const lengthFt = (surface.at(-1)?.stationFt ?? 0) - (surface[0]?.stationFt ?? 0)
  return requireNumber({
    field: 'stationIntervalFt',
    value: intervalFt,
    exclusiveMin: 0,
    min: lengthFt / MOST_INTERVALS,
  })
}
