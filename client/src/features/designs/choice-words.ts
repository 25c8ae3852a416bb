import {
  animalKinds,
  bermCovers,
  bermSoils,
  fenceKinds,
  fenceRoles,
  rainfallDistributions,
  waterBodies,
} from 'shared'
import type { Choice } from '../../components/fields/select-field'

const inWords = <Value extends string>(
  values: readonly Value[],
  words: Record<Value, string>,
): readonly Choice[] => values.map((value) => ({ value, label: words[value] }))

export const animalChoices = inWords(animalKinds, {
  'beef-cow': 'Beef cow',
  'bred-heifer': 'Bred heifer',
  growing: 'Growing cattle',
  finishing: 'Finishing cattle',
  'calf-500': 'Calf, about 500 lb',
  bull: 'Bull',
  'dairy-cow': 'Dairy cow',
  horse: 'Horse',
  sheep: 'Sheep',
  goat: 'Goat',
  other: 'Other',
})

export const bodyChoices = inWords(waterBodies, {
  pond: 'Pond',
  lake: 'Lake',
  stream: 'Stream',
  river: 'River',
})

export const layerChoices = inWords(['surface', 'base'] as const, {
  surface: 'Surface stone',
  base: 'Base stone',
})

export const fenceRoleChoices = inWords(fenceRoles, {
  exclusion: 'Keeps stock off the bank',
  lane: 'Side of the lane',
  closing: 'Closes the ramp in the water',
  other: 'Other',
})

export const fenceKindChoices = inWords(fenceKinds, {
  electric: 'Electric',
  barbed: 'Barbed wire',
  woven: 'Woven wire',
  smooth: 'Smooth wire',
})

export const energizerChoices = inWords(['fence-mile', 'hot-wire-mile'] as const, {
  'fence-mile': 'By miles of fence',
  'hot-wire-mile': 'By miles of hot wire',
})

export const stormChoices = inWords(rainfallDistributions, {
  I: 'Type I',
  IA: 'Type IA',
  II: 'Type II',
  III: 'Type III',
})

export const fallChoices = inWords(['left', 'right', 'both'] as const, {
  left: 'To the left',
  right: 'To the right',
  both: 'Both ways from the middle',
})

export const bermSoilChoices = inWords(bermSoils, {
  'sand-silt-loam': 'Sand, silt or loam',
  'clay-loam': 'Clay loam',
  clay: 'Clay',
})

export const bermCoverChoices = inWords(bermCovers, {
  bare: 'Bare',
  poor: 'Poor grass',
  fair: 'Fair grass',
  good: 'Good grass',
})

export const rateChoices = inWords(['base', 'higher'] as const, {
  base: 'Base rate',
  higher: 'Higher rate, for historically underserved producers',
})
