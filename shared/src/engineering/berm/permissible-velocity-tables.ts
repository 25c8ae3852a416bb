export type BermSoil = 'sand-silt-loam' | 'clay-loam' | 'clay'
export type BermCover = 'bare' | 'poor' | 'fair' | 'good'

/**
 * Greatest runoff velocity along a berm, ft/s, by soil and cover.
 * 'sand-silt-loam' is sand, silt, sandy loam and silty loam; 'clay-loam' is sandy clay and sandy clay loam.
 */
export const bermVelocityTable = {
  source: 'Minnesota Stormwater Manual, maximum runoff velocity for a berm by soil type',
  ftPerS: {
    'sand-silt-loam': { bare: 1.5, poor: 1.5, fair: 2, good: 3 },
    'clay-loam': { bare: 2, poor: 2.5, fair: 3, good: 4 },
    clay: { bare: 2.5, poor: 3, fair: 4, good: 5 },
  } satisfies Record<BermSoil, Record<BermCover, number>>,
} as const

export type SodSoil = 'erosion-resistant' | 'easily-eroded'

interface SodVelocityRow {
  /** Channel slopes the row is for, percent: above the first, up to and with the second. */
  aboveSlopePercent: number
  toSlopePercent: number
  ftPerS: Record<SodSoil, number>
}

export type SodCover = 'bermudagrass' | 'sod-grass' | 'grass-mixture' | 'bunch-grass-or-legume' | 'annual'

interface SodCoverRows {
  name: string
  rows: readonly SodVelocityRow[]
}

const row = (aboveSlopePercent: number, toSlopePercent: number, resistant: number, eroded: number) => ({
  aboveSlopePercent,
  toSlopePercent,
  ftPerS: { 'erosion-resistant': resistant, 'easily-eroded': eroded },
})

/** Greatest velocity in grassed channels, ft/s. Above 5 ft/s only with good cover and upkeep. */
export const sodVelocityTable: { source: string; covers: Record<SodCover, SodCoverRows> } = {
  source:
    'SCS-TP-61, Handbook of Channel Design for Soil and Water Conservation, March 1947, revised June 1954, permissible velocities',
  covers: {
    bermudagrass: {
      name: 'Bermudagrass',
      rows: [row(0, 5, 8, 6), row(5, 10, 7, 5), row(10, 100, 6, 4)],
    },
    'sod-grass': {
      name: 'Bahiagrass, buffalograss, Kentucky bluegrass, smooth brome, blue grama',
      rows: [row(0, 5, 7, 5), row(5, 10, 6, 4), row(10, 100, 5, 3)],
    },
    'grass-mixture': {
      name: 'Grass mixtures, reed canarygrass',
      rows: [row(0, 5, 5, 4), row(5, 10, 4, 3)],
    },
    'bunch-grass-or-legume': {
      name: 'Sericea lespedeza, weeping lovegrass, yellow bluestem, redtop, alfalfa, red fescue',
      rows: [row(0, 5, 3.5, 2.5)],
    },
    annual: { name: 'Annuals, temporary cover', rows: [row(0, 5, 3.5, 2.5)] },
  },
}
