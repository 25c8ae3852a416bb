import { EngineeringInputError } from '../engineering-input-error.js'
import { requireNumber } from '../require-number.js'
import { fabricLayout, type FabricLayout } from './fabric-layout.js'

export interface FabricTakeOffInput {
  slopeLengthFt: number
  /** Along the slope from the toe up to the water expected while building; 0 when the pond is drawn down. */
  wetLengthFt: number
  formationWidthFt: number
  sideTurnUpFt: number
  topAnchorFt: number
  toeWrapFt: number
  rollWidthFt: number
  rollLengthFt: number
  lapDryFt: number
  lapWetFt: number
}

export interface FabricTakeOff {
  coverWidthFt: number
  coverLengthFt: number
  wetCoverLengthFt: number
  netAreaFt2: number
  along: FabricLayout
  across: FabricLayout
  recommended: 'along' | 'across'
  reason: string
}

const MOST_STRIPS = 10000

/**
 * Fabric under the rock, laid along or across the ramp. Cover W = formation width + 2 · turn-up; L = slope length +
 * top anchor + toe wrap; net = W · L. Along: strips of length L side by side, all with the wet lap when any part lies
 * in water. Across: strips of length W from the toe up; a joint takes the wet lap when its lower edge is under water.
 * Gross = strips · roll · strip; trim = gross − net − laps. Recommended: fewer rolls, then less gross area, then along.
 *
 * @param input lengths in ft: slopeLengthFt > 0; wetLengthFt 0 to slopeLengthFt; formationWidthFt > 0; sideTurnUpFt,
 *   topAnchorFt, toeWrapFt ≥ 0; rollWidthFt and rollLengthFt > 0; lapDryFt and lapWetFt ≥ 0 and less than the roll.
 * @returns cover (ft), net area (ft²), for both directions strips, length, gross, lap and trim area, joints, pieces
 *   and rolls; the recommended one and why.
 * @throws EngineeringInputError naming the field.
 * @see common practice, no source (layout); laps of 18 to 24 in: NRCS Construction Specification 578 and Tennessee
 *   heavy use area sheet, November 2001.
 * @example fabricTakeOff({ slopeLengthFt: 56, wetLengthFt: 33, formationWidthFt: 21, sideTurnUpFt: 1, topAnchorFt: 2,
 *   toeWrapFt: 3, rollWidthFt: 15, rollLengthFt: 300, lapDryFt: 2, lapWetFt: 3 }).along.strips // 2
 */
export function fabricTakeOff(input: FabricTakeOffInput): FabricTakeOff {
  const size = checked(input)
  const coverWidthFt = size.formationWidthFt + 2 * size.sideTurnUpFt
  const coverLengthFt = size.slopeLengthFt + size.topAnchorFt + size.toeWrapFt
  const isWet = size.wetLengthFt > 0
  const wetCoverLengthFt = isWet ? size.wetLengthFt + size.toeWrapFt : 0
  const roll = { widthFt: size.rollWidthFt, lengthFt: size.rollLengthFt }
  const lapFt = isWet ? size.lapWetFt : size.lapDryFt
  refuseEndlessStrips({
    coverFt: Math.max(coverWidthFt, coverLengthFt),
    advanceFt: roll.widthFt - Math.max(size.lapDryFt, size.lapWetFt),
  })
  const along = fabricLayout({
    coverFt: coverWidthFt,
    stripLengthFt: coverLengthFt,
    roll,
    lapAt: () => lapFt,
    endLapFt: lapFt,
  })
  const across = fabricLayout({
    coverFt: coverLengthFt,
    stripLengthFt: coverWidthFt,
    roll,
    lapAt: (coveredFt) => (coveredFt - size.lapDryFt < wetCoverLengthFt ? size.lapWetFt : size.lapDryFt),
    endLapFt: lapFt,
  })
  const netAreaFt2 = coverWidthFt * coverLengthFt
  return {
    coverWidthFt,
    coverLengthFt,
    wetCoverLengthFt,
    netAreaFt2,
    along,
    across,
    ...recommend({ along, across }),
  }
}

function recommend({
  along,
  across,
}: Pick<FabricTakeOff, 'along' | 'across'>): Pick<FabricTakeOff, 'recommended' | 'reason'> {
  if (along.rolls !== across.rolls) {
    return { recommended: along.rolls < across.rolls ? 'along' : 'across', reason: 'fewer rolls' }
  }
  if (Math.abs(along.grossAreaFt2 - across.grossAreaFt2) > 1e-9) {
    const recommended = along.grossAreaFt2 < across.grossAreaFt2 ? 'along' : 'across'
    return { recommended, reason: 'same rolls, less gross area' }
  }
  return { recommended: 'along', reason: 'same rolls and gross area, fewer joints across the slope' }
}

function checked(input: FabricTakeOffInput): FabricTakeOffInput {
  const positive = (field: keyof FabricTakeOffInput) =>
    requireNumber({ field, value: input[field], exclusiveMin: 0 })
  const upTo = (field: keyof FabricTakeOffInput, max?: number) =>
    requireNumber({ field, value: input[field], min: 0, max })
  const slopeLengthFt = positive('slopeLengthFt')
  const rollWidthFt = positive('rollWidthFt')
  const rollLengthFt = positive('rollLengthFt')
  const lap = (field: 'lapDryFt' | 'lapWetFt') =>
    requireNumber({ field, value: input[field], min: 0, exclusiveMax: Math.min(rollWidthFt, rollLengthFt) })
  return {
    slopeLengthFt,
    // The wet length comes from another sum of the same figures and may pass the slope by a hair.
    wetLengthFt: Math.min(upTo('wetLengthFt', slopeLengthFt + 1e-9), slopeLengthFt),
    formationWidthFt: positive('formationWidthFt'),
    sideTurnUpFt: upTo('sideTurnUpFt'),
    topAnchorFt: upTo('topAnchorFt'),
    toeWrapFt: upTo('toeWrapFt'),
    rollWidthFt,
    rollLengthFt,
    lapDryFt: lap('lapDryFt'),
    lapWetFt: lap('lapWetFt'),
  }
}

function refuseEndlessStrips({ coverFt, advanceFt }: { coverFt: number; advanceFt: number }): void {
  if (coverFt / advanceFt < MOST_STRIPS) return
  throw new EngineeringInputError({
    field: 'rollWidthFt',
    message: `rollWidthFt leaves only ${advanceFt} ft of new cover per strip; use a wider roll or a smaller lap.`,
  })
}
