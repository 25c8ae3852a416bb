import { z } from 'zod'
import { stationFt } from './level-notes.js'
import { lineOfText, numberBetween } from './primitives.js'

export const rainfallDistributions = ['I', 'IA', 'II', 'III'] as const

export const runoffPlanSchema = z.strictObject({
  areaAcres: numberBetween(0.01, 2000, 'acres'),
  curveNumber: numberBetween(30, 100, ''),
  rainfallIn: numberBetween(0, 40, 'in'),
  rainfallSource: lineOfText(160),
  returnPeriodYr: z.number().int().min(1).max(1000),
  distribution: z.enum(rainfallDistributions),
  flowLengthFt: numberBetween(10, 30000, 'ft'),
  landSlopePercent: numberBetween(0.1, 64, 'percent'),
  pondPercent: numberBetween(0, 100, 'percent').optional(),
  rational: z
    .strictObject({
      runoffCoefficient: numberBetween(0.01, 1, ''),
      intensities: z
        .array(
          z.strictObject({
            durationMin: numberBetween(1, 1440, 'min'),
            intensityInPerHr: numberBetween(0.01, 40, 'in per hour'),
          }),
        )
        .min(1)
        .max(20),
    })
    .optional(),
})

export const bermSoils = ['sand-silt-loam', 'clay-loam', 'clay'] as const
export const bermCovers = ['bare', 'poor', 'fair', 'good'] as const

export const bermPlanSchema = z.strictObject({
  crestStationFt: stationFt,
  channelGradeFtPerFt: numberBetween(0.0001, 0.2, 'ft per ft'),
  groundFallFtPerFt: numberBetween(0, 0.5, 'ft per ft'),
  upslopeRunPerRise: numberBetween(1, 20, 'run per rise'),
  downslopeRunPerRise: numberBetween(1, 20, 'run per rise'),
  topWidthFt: numberBetween(0, 20, 'ft'),
  roughnessHigh: numberBetween(0.01, 0.5, ''),
  roughnessLow: numberBetween(0.01, 0.5, ''),
  minimumHeightFt: numberBetween(0, 10, 'ft'),
  pastLeftFt: numberBetween(0, 1000, 'ft'),
  pastRightFt: numberBetween(0, 1000, 'ft'),
  falls: z.enum(['left', 'right', 'both']),
  outletSurface: lineOfText(80),
  outletIsStable: z.boolean(),
  outletToRampFt: numberBetween(0, 5000, 'ft'),
  soil: z.enum(bermSoils),
  cover: z.enum(bermCovers),
})
