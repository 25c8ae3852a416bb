import { z } from 'zod'
import { fencePlanSchema } from './fence-plan.js'
import { fundingPlanSchema } from './funding-plan.js'
import { elevationFt, stationFt } from './level-notes.js'
import { lineOfText, numberBetween, planPointSchema } from './primitives.js'
import { bermPlanSchema, runoffPlanSchema } from './water-plan.js'

export const waterBodies = ['pond', 'lake', 'stream', 'river'] as const
export const waterBodySchema = z.enum(waterBodies)

export const animalKinds = [
  'beef-cow',
  'bred-heifer',
  'growing',
  'finishing',
  'calf-500',
  'bull',
  'dairy-cow',
  'horse',
  'sheep',
  'goat',
  'other',
] as const

const sideRunPerRise = numberBetween(0, 10, 'run per rise')

export const herdPlanSchema = z.strictObject({
  headCount: z.number().int('Count whole animals').min(1).max(10000),
  shareAtOncePercent: numberBetween(1, 100, 'percent'),
  frontageFtPerHead: numberBetween(0.5, 10, 'ft'),
  classes: z
    .array(
      z.strictObject({
        kind: z.enum(animalKinds),
        head: z.number().int().min(1).max(10000),
        weightLb: numberBetween(50, 3000, 'lb').optional(),
        milkLb: numberBetween(0, 150, 'lb').optional(),
        temperatureF: numberBetween(-40, 130, '°F'),
        perHeadGal: numberBetween(0.1, 100, 'gal').optional(),
      }),
    )
    .min(1)
    .max(20),
})

/** Water levels. The ground line itself comes from the survey of the job. */
export const sitePlanSchema = z.strictObject({
  body: waterBodySchema,
  fullPoolElevationFt: elevationFt,
  lowWaterElevationFt: elevationFt.optional(),
  drawdownFt: numberBetween(0, 50, 'ft').optional(),
  waterSurfaceTodayFt: elevationFt,
  floodPoolElevationFt: elevationFt.optional(),
  topOfDamElevationFt: elevationFt.optional(),
  /** From ramp and lane in plan; left out where the water has none near by. */
  distanceToDamFt: numberBetween(0, 10000, 'ft').optional(),
  distanceToSpillwayFt: numberBetween(0, 10000, 'ft').optional(),
  distanceToInflowFt: numberBetween(0, 10000, 'ft').optional(),
  soil: lineOfText(80).optional(),
  waterOutline: z.array(planPointSchema).min(3).max(2000).optional(),
})

export const rampPlanSchema = z.strictObject({
  widthFt: numberBetween(4, 120, 'ft'),
  gradeRunPerRise: numberBetween(2, 40, 'run per rise'),
  topAboveFullPoolFt: numberBetween(0, 20, 'ft'),
  toeBelowFullPoolFt: numberBetween(0, 20, 'ft'),
  drinkingDepthAtLowWaterFt: numberBetween(0.25, 6, 'ft'),
  rampTopStationFt: stationFt.optional(),
  apronLengthFt: numberBetween(0, 50, 'ft').optional(),
  landingLengthFt: numberBetween(0, 50, 'ft').optional(),
})

export const earthworkPlanSchema = z.strictObject({
  edgeAllowanceFt: numberBetween(0, 10, 'ft'),
  cutSideRunPerRise: sideRunPerRise,
  fillSideRunPerRise: sideRunPerRise,
  stationIntervalFt: numberBetween(1, 100, 'ft'),
})

export const rockLayerSchema = z.strictObject({
  role: z.enum(['surface', 'base']),
  name: lineOfText(60),
  stoneSizeIn: numberBetween(0.1, 36, 'in'),
  thicknessIn: numberBetween(1, 60, 'in'),
  unitWeightTonsPerYd3: numberBetween(0.5, 3, 'tons per cubic yard'),
  wastePercent: numberBetween(0, 50, 'percent'),
  truckTons: numberBetween(1, 40, 'tons').optional(),
})

export const rockPlanSchema = z.strictObject({
  edgeRunPerRise: numberBetween(0, 5, 'run per rise'),
  layers: z.array(rockLayerSchema).min(1).max(8),
})

export const fabricPlanSchema = z.strictObject({
  product: lineOfText(80),
  sideTurnUpFt: numberBetween(0, 10, 'ft'),
  topAnchorFt: numberBetween(0, 10, 'ft'),
  toeWrapFt: numberBetween(0, 20, 'ft'),
  rollWidthFt: numberBetween(3, 30, 'ft'),
  rollLengthFt: numberBetween(20, 1000, 'ft'),
  lapDryFt: numberBetween(0, 10, 'ft'),
  lapWetFt: numberBetween(0, 10, 'ft'),
  grabStrengthLb: numberBetween(1, 2000, 'lb').optional(),
})

export const padPlanSchema = z.strictObject({
  approach: z
    .strictObject({
      lengthFt: numberBetween(1, 200, 'ft'),
      widthFt: numberBetween(4, 200, 'ft'),
      thicknessIn: numberBetween(2, 36, 'in'),
      unitWeightTonsPerYd3: numberBetween(0.5, 3, 'tons per cubic yard'),
      wastePercent: numberBetween(0, 50, 'percent'),
      thickenAtRampFt: numberBetween(0, 20, 'ft'),
    })
    .optional(),
})

export const closingPanelPlanSchema = z.strictObject({
  clearFt: numberBetween(0, 20, 'ft'),
  beyondToeFt: numberBetween(0, 40, 'ft'),
  aboveWaterFt: numberBetween(0, 8, 'ft'),
  postSpacingFt: numberBetween(4, 40, 'ft'),
})

export const pondPlanSchema = z.strictObject({
  stages: z
    .array(z.strictObject({ elevationFt, areaFt2: numberBetween(0, 1e9, 'square feet') }))
    .min(2)
    .max(100),
  evaporationInPerDay: numberBetween(0, 2, 'in per day'),
  seepageInPerDay: numberBetween(0, 5, 'in per day'),
})

export const seedingPlanSchema = z.strictObject({
  extraDisturbedAreaFt2: numberBetween(0, 1e7, 'square feet'),
  mulchTonsPerAcre: numberBetween(0, 10, 'tons per acre'),
  mix: z
    .array(
      z.strictObject({
        species: lineOfText(60),
        pureStandLbPlsPerAcre: numberBetween(0.1, 500, 'lb per acre'),
        sharePercent: numberBetween(0, 100, 'percent'),
        purity: numberBetween(0.01, 1, ''),
        germination: numberBetween(0.01, 1, ''),
      }),
    )
    .min(1)
    .max(20),
})

/**
 * What the planner chooses. Every part may still be missing, since a design is filled in over days;
 * computeDesign says of each part whether it can be worked out yet.
 */
export const designPlanSchema = z.strictObject({
  inputVersion: z.literal(1),
  herd: herdPlanSchema.optional(),
  site: sitePlanSchema.optional(),
  ramp: rampPlanSchema.optional(),
  earthwork: earthworkPlanSchema.optional(),
  rock: rockPlanSchema.optional(),
  fabric: fabricPlanSchema.optional(),
  pads: padPlanSchema.optional(),
  closingPanel: closingPanelPlanSchema.optional(),
  fence: fencePlanSchema.optional(),
  runoff: runoffPlanSchema.optional(),
  berm: bermPlanSchema.optional(),
  pond: pondPlanSchema.optional(),
  seeding: seedingPlanSchema.optional(),
  funding: fundingPlanSchema.optional(),
})

export type DesignPlan = z.infer<typeof designPlanSchema>
export type DesignPart = Exclude<keyof DesignPlan, 'inputVersion'>
