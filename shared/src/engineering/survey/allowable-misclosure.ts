import { EngineeringInputError } from '../engineering-input-error.js'
import { requireNumber } from '../require-number.js'

export interface LevelClosing {
  /** Published or earlier elevation of the closing point, ft. */
  knownElevationFt: number
  lengthMiles?: number
  lengthFt?: number
  /** Allowable for one mile, ft; grows with the root of the length. */
  coefficientFt?: number
  /** Allowable for one setup, ft; grows with the root of the number of setups. */
  perSetupFt?: number
  /** Floor, ft, so that a short line is not held to less than two rod readings can give. */
  minimumFt?: number
}

export type AllowableRule = 'length' | 'setups' | 'minimum'

export interface AllowableMisclosure {
  allowableFt: number
  allowableRule: AllowableRule
}

const FEET_PER_MILE = 5280

/** The larger of coefficient · √miles, perSetup · √setups and the floor, whichever are given, and which it was. */
export function allowableMisclosure({
  closing,
  setups,
}: {
  closing: LevelClosing
  setups: number
}): AllowableMisclosure {
  const candidates: AllowableMisclosure[] = []
  if (closing.coefficientFt !== undefined) {
    const coefficient = positive('closing.coefficientFt', closing.coefficientFt)
    candidates.push({ allowableFt: coefficient * Math.sqrt(lengthInMiles(closing)), allowableRule: 'length' })
  }
  if (closing.perSetupFt !== undefined) {
    const perSetup = positive('closing.perSetupFt', closing.perSetupFt)
    candidates.push({ allowableFt: perSetup * Math.sqrt(setups), allowableRule: 'setups' })
  }
  if (closing.minimumFt !== undefined) {
    const allowableFt = requireNumber({ field: 'closing.minimumFt', value: closing.minimumFt, min: 0 })
    candidates.push({ allowableFt, allowableRule: 'minimum' })
  }
  const [first, ...others] = candidates
  if (first === undefined) {
    throw new EngineeringInputError({
      field: 'closing',
      message: 'closing has no allowable; give coefficientFt with a length, perSetupFt, or minimumFt.',
    })
  }
  return others.reduce((best, next) => (next.allowableFt > best.allowableFt ? next : best), first)
}

function lengthInMiles({ lengthMiles, lengthFt }: LevelClosing): number {
  if (lengthMiles !== undefined)
    return requireNumber({ field: 'closing.lengthMiles', value: lengthMiles, min: 0 })
  return requireNumber({ field: 'closing.lengthFt', value: lengthFt, min: 0 }) / FEET_PER_MILE
}

function positive(field: string, value: number): number {
  return requireNumber({ field, value, exclusiveMin: 0 })
}
