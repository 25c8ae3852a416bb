/**
 * Every line a bill of quantities can hold, in the order in which it is printed. Practice numbers are those of the
 * published conservation practice standards (342, 362, 382, 561).
 */
export const quantityCatalogue = {
  'excavation-dry': {
    practice: '561',
    description: 'Excavation above the water',
    unit: 'yd3',
    basis: 'in-place',
  },
  'excavation-wet': {
    practice: '561',
    description: 'Excavation under water',
    unit: 'yd3',
    basis: 'in-place',
  },
  'earth-fill': {
    practice: '561',
    description: 'Earth fill and backfill, compacted',
    unit: 'yd3',
    basis: 'in-place',
  },
  'stone-surface': { practice: '561', description: 'Surface stone', unit: 'ton', basis: 'order' },
  'stone-base': { practice: '561', description: 'Base stone', unit: 'ton', basis: 'order' },
  fabric: { practice: '561', description: 'Fabric under the ramp', unit: 'yd2', basis: 'order' },
  'fabric-pad': {
    practice: '561',
    description: 'Fabric under the approach pad',
    unit: 'yd2',
    basis: 'order',
  },
  'fence-electric': { practice: '382', description: 'Electric fence', unit: 'ft', basis: 'in-place' },
  'fence-barbed': { practice: '382', description: 'Barbed wire fence', unit: 'ft', basis: 'in-place' },
  'fence-woven': { practice: '382', description: 'Woven wire fence', unit: 'ft', basis: 'in-place' },
  'fence-smooth': { practice: '382', description: 'Smooth wire fence', unit: 'ft', basis: 'in-place' },
  'closing-panel': {
    practice: '382',
    description: 'Closing panel in the water',
    unit: 'ft',
    basis: 'in-place',
  },
  gate: { practice: '382', description: 'Gate', unit: 'each', basis: 'in-place' },
  'energizer-and-grounding': {
    practice: '382',
    description: 'Energizer and grounding',
    unit: 'each',
    basis: 'in-place',
  },
  berm: { practice: '362', description: 'Berm, compacted earth', unit: 'yd3', basis: 'in-place' },
  seeding: { practice: '342', description: 'Seeding and mulch', unit: 'acre', basis: 'in-place' },
} as const

export type QuantityKey = keyof typeof quantityCatalogue

export const quantityKeys = Object.keys(quantityCatalogue) as QuantityKey[]
