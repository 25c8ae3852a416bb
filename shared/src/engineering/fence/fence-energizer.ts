import { requireNumber } from '../require-number.js'
import type { EnergizerRule, GroundRodRule } from './fence-input.js'
import { wholePieces } from './whole-pieces.js'

export interface FenceEnergizer {
  fenceMiles: number
  hotWireMiles: number
  existingMiles: number
  /** Output by the rule. */
  neededJoules: number
  /** Next size up of the district's list; absent without a list, or when the list ends below the need. */
  sizeJoules?: number
  rodFtByRule: number
  rodsByRule: number
  rods: number
  rodFt: number
  rodsGovernedBy: 'length per joule' | 'minimum number'
  notes: string[]
}

export interface FenceEnergizerInput {
  /** Energized fence, ft, and the hot wire on it, ft, both greater than 0. */
  fenceFt: number
  hotWireFt: number
  existingEnergizedMiles?: number
  energizerRule: EnergizerRule
  groundRodRule: GroundRodRule
}

const FT_PER_MILE = 5280

/**
 * Energizer and ground rods: joules = (miles of fence or of hot wire + existing miles) · joules per mile;
 * rods = the larger of ceil(joules · ft per joule / rod length) and the least number. The rods serve the size that is
 * bought where a list of sizes is given.
 *
 * @returns joules of output, rods and their length in ft, and which rule governs.
 * @throws EngineeringInputError naming the field of the rule.
 * Source: 1 joule per mile, Gerrish, Common Fencing Mistakes, Beef Magazine; by hot-wire mile, University of Maine
 * Extension, Electric Fence Design; 3 ft of rod per joule, NRCS Virginia job sheet 382, June 2009.
 * @example fenceEnergizer({ fenceFt: 6 * 5280, hotWireFt: 6 * 5280, energizerRule: { basis: 'fence-mile', joulesPerMile: 1 }, groundRodRule: { rodFtPerJoule: 3, rodLengthFt: 6, minimumRods: 1 } }).rods // 3
 */
export function fenceEnergizer(input: FenceEnergizerInput): FenceEnergizer {
  const { energizerRule: rule } = input
  const existingMiles = requireNumber({
    field: 'existingEnergizedMiles',
    value: input.existingEnergizedMiles ?? 0,
    min: 0,
  })
  const perMile = requireNumber({
    field: 'energizerRule.joulesPerMile',
    value: rule.joulesPerMile,
    exclusiveMin: 0,
  })
  const fenceMiles = input.fenceFt / FT_PER_MILE
  const hotWireMiles = input.hotWireFt / FT_PER_MILE
  const neededJoules =
    ((rule.basis === 'hot-wire-mile' ? hotWireMiles : fenceMiles) + existingMiles) * perMile
  const sizeJoules = nextSize(rule.sizesJoules ?? [], neededJoules)
  const listIsShort = rule.sizesJoules !== undefined && sizeJoules === undefined
  return {
    fenceMiles,
    hotWireMiles,
    existingMiles,
    neededJoules,
    ...(sizeJoules === undefined ? {} : { sizeJoules }),
    ...groundRods(input.groundRodRule, sizeJoules ?? neededJoules),
    notes: listIsShort ? ['No energizer of the list has the output that this fence needs.'] : [],
  }
}

function nextSize(sizes: readonly number[], neededJoules: number): number | undefined {
  sizes.forEach((value, index) => {
    const field = `energizerRule.sizesJoules[${index}]`
    requireNumber({ field, value, exclusiveMin: sizes[index - 1] ?? 0 })
  })
  return sizes.find((size) => size >= neededJoules - 1e-9)
}

function groundRods(rule: GroundRodRule, joules: number) {
  const positive = { exclusiveMin: 0 }
  const perJoule = requireNumber({
    field: 'groundRodRule.rodFtPerJoule',
    value: rule.rodFtPerJoule,
    ...positive,
  })
  const rodLength = requireNumber({
    field: 'groundRodRule.rodLengthFt',
    value: rule.rodLengthFt,
    ...positive,
  })
  const least = { value: rule.minimumRods, min: 0, integer: true }
  const minimumRods = requireNumber({ field: 'groundRodRule.minimumRods', ...least })
  const rodFtByRule = joules * perJoule
  const rodsByRule = wholePieces(rodFtByRule, rodLength)
  const rods = Math.max(rodsByRule, minimumRods)
  const rodsGovernedBy: FenceEnergizer['rodsGovernedBy'] =
    rodsByRule >= minimumRods ? 'length per joule' : 'minimum number'
  return { rodFtByRule, rodsByRule, rods, rodFt: rods * rodLength, rodsGovernedBy }
}
