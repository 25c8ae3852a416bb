import { requireNumber } from '../require-number.js'
import { findSelfCrossing } from '../survey/find-self-crossing.js'
import { signedAreaFt2, type PlanPoint } from '../survey/signed-area.js'
import { exclusionRing } from './exclusion-ring.js'
import type { FenceTakeOffInput } from './fence-input.js'
import type { RunLayout } from './run-layout.js'
import { setbackFt } from './setback-ft.js'

/** Each is absent, not 0, where an exclusion run is not drawn or the water has no outline. */
export interface FenceAreas {
  /** Least distance of the exclusion runs to the water's edge, ft. */
  setbackFt?: number
  /** Inside the exclusion runs, closed across the mouth of the lane, ft². */
  enclosedAreaFt2?: number
  waterAreaFt2?: number
  /** Enclosed less water, ramp and lane, ft². */
  habitatAreaFt2?: number
}

interface FenceAreasInput extends Pick<FenceTakeOffInput, 'waterOutline' | 'laneAreaFt2'> {
  layouts: readonly RunLayout[]
}

/**
 * Setback and areas of the exclusion runs; lane and closing runs go to the water on purpose and do not count.
 *
 * @returns the areas, and a note where the fence crosses itself or does not hold the water.
 * @throws EngineeringInputError naming laneAreaFt2 or a coordinate of waterOutline.
 * Source: plane geometry (shoelace).
 */
export function fenceAreas(input: FenceAreasInput): { areas: FenceAreas; notes: string[] } {
  const lane = requireNumber({ field: 'laneAreaFt2', value: input.laneAreaFt2 ?? 0, min: 0 })
  const outline = checkedOutline(input.waterOutline ?? [])
  const lines = input.layouts.filter(({ run }) => run.role === 'exclusion').map(({ path }) => path.points)
  const isDrawn = lines.length > 0 && lines.every((points) => points.length > 1)
  if (!isDrawn) return { areas: {}, notes: [] }
  const setback = outline.length > 2 ? { setbackFt: setbackFt({ lines, outline }) } : {}
  const ring = exclusionRing(lines)
  const crossing = findSelfCrossing(ring)
  if (crossing) {
    const note = `The exclusion fence crosses itself at legs ${crossing.first} and ${crossing.second}; its area is left out.`
    return { areas: setback, notes: [note] }
  }
  const enclosedAreaFt2 = Math.abs(signedAreaFt2(ring))
  if (outline.length < 3) return { areas: { enclosedAreaFt2 }, notes: [] }
  const waterAreaFt2 = Math.abs(signedAreaFt2(outline))
  const habitatAreaFt2 = enclosedAreaFt2 - waterAreaFt2 - lane
  if (habitatAreaFt2 < 0) {
    const note =
      'The exclusion fence encloses less than the water and the lane; the area set aside is left out.'
    return { areas: { ...setback, enclosedAreaFt2, waterAreaFt2 }, notes: [note] }
  }
  return { areas: { ...setback, enclosedAreaFt2, waterAreaFt2, habitatAreaFt2 }, notes: [] }
}

const checkedOutline = (outline: readonly PlanPoint[]): PlanPoint[] =>
  outline.map(({ eastFt, northFt }, index) => ({
    eastFt: requireNumber({ field: `waterOutline[${index}].eastFt`, value: eastFt }),
    northFt: requireNumber({ field: `waterOutline[${index}].northFt`, value: northFt }),
  }))
