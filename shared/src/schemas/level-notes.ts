import { z } from 'zod'
import { lineOfText, numberBetween } from './primitives.js'

const readingFt = numberBetween(-30, 60, 'ft')
export const elevationFt = numberBetween(-1000, 20000, 'ft')
export const stationFt = numberBetween(-1000, 100000, 'ft')

/** As many as a file may have, too. */
export const mostLevelNoteRows = 2000

/** One row of a field book, in field order. */
export const levelNoteRowSchema = z.strictObject({
  label: lineOfText(60),
  stationFt: stationFt.optional(),
  backsightFt: readingFt.optional(),
  intermediateFt: readingFt.optional(),
  foresightFt: readingFt.optional(),
  waterDepthFt: numberBetween(0, 100, 'ft').optional(),
})

export const levelClosingSchema = z.strictObject({
  knownElevationFt: elevationFt,
  lengthMiles: numberBetween(0, 50, 'miles').optional(),
  lengthFt: numberBetween(0, 250000, 'ft').optional(),
  coefficientFt: numberBetween(0.001, 5, 'ft').optional(),
  perSetupFt: numberBetween(0.001, 5, 'ft').optional(),
  minimumFt: numberBetween(0, 5, 'ft').optional(),
})

export const groundPointSchema = z.union([
  z.strictObject({ stationFt, elevationFt }),
  z.strictObject({ stationFt, waterDepthFt: numberBetween(0, 100, 'ft') }),
])

/** A survey is either a page of level notes or a ground line that was measured another way. */
export const surveyInputSchema = z.discriminatedUnion('kind', [
  z.strictObject({
    kind: z.literal('level-notes'),
    startElevationFt: elevationFt,
    waterSurfaceFt: elevationFt.optional(),
    rows: z.array(levelNoteRowSchema).min(2, 'Level notes need at least two rows').max(mostLevelNoteRows),
    closing: levelClosingSchema.optional(),
  }),
  z.strictObject({
    kind: z.literal('ground-line'),
    waterSurfaceFt: elevationFt.optional(),
    points: z.array(groundPointSchema).min(2, 'A ground line needs at least two points').max(2000),
  }),
])

export type LevelNoteRow = z.infer<typeof levelNoteRowSchema>
export type SurveyInput = z.infer<typeof surveyInputSchema>
