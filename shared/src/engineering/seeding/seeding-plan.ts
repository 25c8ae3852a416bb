import { EngineeringInputError } from '../engineering-input-error.js'
import { forWords } from '../for-words.js'
import { requireNumber } from '../require-number.js'
import { FT2_PER_ACRE } from '../unit-factors.js'

export interface SeedInput {
  species: string
  pureStandLbPlsPerAcre: number
  sharePercent: number
  purity: number
  germination: number
}

export interface SeedingPlanInput {
  disturbedAreaFt2: number
  mix: readonly SeedInput[]
  mulchTonsPerAcre: number
}

export interface SeedNeed {
  species: string
  /** Pure live seed. */
  plsLb: number
  /** As it comes in the bag. */
  bulkLb: number
}

export interface SeedingPlan {
  disturbedAreaFt2: number
  acres: number
  mix: SeedNeed[]
  mulchTons: number
}

/** Three shares of a third are written 33.33. */
const SHARE_TOLERANCE_PERCENT = 0.05

/**
 * Seed and mulch for disturbed ground. acres = ft²/43,560; pure live seed = pounds an acre of a pure stand · share of
 * the mix · acres; bulk seed = pure live seed / (purity · germination); mulch = tons an acre · acres.
 *
 * @param input.disturbedAreaFt2 ft² ≥ 0; mulchTonsPerAcre short tons ≥ 0.
 * @param input.mix 1 or more: pureStandLbPlsPerAcre lb > 0, sharePercent 0–100 and together 100, purity and germination
 *   as on the seed tag, over 0 to 1.
 * @returns acres; each species' pure live seed and bulk seed, lb; mulch, short tons.
 * @throws EngineeringInputError naming the field.
 * @see NRCS Montana, critical area planting job sheet, 2003 (seed need); Soil Conservation Service, Colorado, seeding
 *   specification (mulch 2 tons an acre); bulk seed: definition of pure live seed.
 * @example seedingPlan({ disturbedAreaFt2: 43560, mulchTonsPerAcre: 2, mix: [{ species: 'a', sharePercent: 100,
 *   pureStandLbPlsPerAcre: 20, purity: 0.97, germination: 0.85 }] }).mix[0]?.bulkLb // 24.257
 */
export function seedingPlan({ disturbedAreaFt2, mix, mulchTonsPerAcre }: SeedingPlanInput): SeedingPlan {
  const areaFt2 = requireNumber({ field: 'disturbedAreaFt2', value: disturbedAreaFt2, min: 0 })
  const acres = areaFt2 / FT2_PER_ACRE
  requireWholeMix(mix)
  return {
    disturbedAreaFt2: areaFt2,
    acres,
    mix: mix.map((seed, index) => seedNeed({ seed, index, acres })),
    mulchTons: requireNumber({ field: 'mulchTonsPerAcre', value: mulchTonsPerAcre, min: 0 }) * acres,
  }
}

function seedNeed({ seed, index, acres }: { seed: SeedInput; index: number; acres: number }): SeedNeed {
  const read = (field: Exclude<keyof SeedInput, 'species'>, rule: { exclusiveMin?: number; max?: number }) =>
    requireNumber({ field: `mix[${index}].${field}`, value: seed[field], ...rule })
  const rateLbPerAcre = read('pureStandLbPlsPerAcre', { exclusiveMin: 0 })
  const live = read('purity', { exclusiveMin: 0, max: 1 }) * read('germination', { exclusiveMin: 0, max: 1 })
  const plsLb = rateLbPerAcre * (seed.sharePercent / 100) * acres
  return { species: seed.species, plsLb, bulkLb: plsLb / live }
}

/** A share that nobody entered would leave ground bare without a word. */
function requireWholeMix(mix: readonly SeedInput[]): void {
  if (!Array.isArray(mix) || mix.length === 0) {
    throw new EngineeringInputError({ field: 'mix', message: 'The seed mix needs at least one species.' })
  }
  const shares = mix.map(({ sharePercent: value }: SeedInput, index) =>
    requireNumber({ field: `mix[${index}].sharePercent`, value, min: 0, max: 100 }),
  )
  const sum = shares.reduce((total, share) => total + share, 0)
  if (Math.abs(sum - 100) > SHARE_TOLERANCE_PERCENT) {
    const message = `The shares of the seed mix come to ${forWords(sum)} %; together they must come to 100 %.`
    throw new EngineeringInputError({ field: 'mix', message })
  }
}
