import type { DesignPlan } from 'shared'

const stone = { unitWeightTonsPerYd3: 1.35, wastePercent: 5, truckTons: 18 }

/** What the planners of the example districts choose unless a site asks for something else. */
export const usualParts = {
  earthwork: { edgeAllowanceFt: 0, cutSideRunPerRise: 3, fillSideRunPerRise: 3, stationIntervalFt: 10 },
  rock: {
    edgeRunPerRise: 1.5,
    layers: [
      { role: 'surface', name: 'surface stone', stoneSizeIn: 2, thicknessIn: 6, ...stone },
      { role: 'base', name: 'base stone', stoneSizeIn: 4, thicknessIn: 6, ...stone },
    ],
  },
  fabric: {
    product: '8 oz nonwoven',
    sideTurnUpFt: 1,
    topAnchorFt: 2,
    toeWrapFt: 3,
    rollWidthFt: 15,
    rollLengthFt: 300,
    lapDryFt: 2,
    lapWetFt: 3,
    grabStrengthLb: 205,
  },
  closingPanel: { clearFt: 1, beyondToeFt: 3, aboveWaterFt: 3, postSpacingFt: 10 },
  seeding: {
    extraDisturbedAreaFt2: 1100,
    mulchTonsPerAcre: 2,
    mix: [
      {
        species: 'tall fescue',
        pureStandLbPlsPerAcre: 20,
        sharePercent: 70,
        purity: 0.96,
        germination: 0.86,
      },
      { species: 'white clover', pureStandLbPlsPerAcre: 4, sharePercent: 30, purity: 0.98, germination: 0.9 },
    ],
  },
} satisfies Partial<DesignPlan>

/** Cows with calves at their side on a hot day. */
export const beefHerd = (headCount: number): DesignPlan['herd'] => ({
  headCount,
  shareAtOncePercent: 10,
  frontageFtPerHead: 2,
  classes: [{ kind: 'beef-cow', head: headCount, weightLb: 1250, milkLb: 22, temperatureF: 88 }],
})

export const approachPad = (widthFt: number, lengthFt: number): DesignPlan['pads'] => ({
  approach: {
    lengthFt,
    widthFt,
    thicknessIn: 8,
    unitWeightTonsPerYd3: 1.35,
    wastePercent: 5,
    thickenAtRampFt: 3,
  },
})
