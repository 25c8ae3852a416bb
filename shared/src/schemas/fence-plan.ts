import { z } from 'zod'
import { numberText } from '../format/number-text.js'
import { lineOfText, numberBetween, planPointSchema } from './primitives.js'

const pathSchema = z.union([
  z.strictObject({ points: z.array(planPointSchema).min(2).max(500) }),
  z.strictObject({
    lengthFt: numberBetween(1, 100000, 'ft'),
    startsAt: lineOfText(40).optional(),
    endsAt: lineOfText(40).optional(),
  }),
])

export const fenceRoles = ['exclusion', 'lane', 'closing', 'other'] as const
export const fenceKinds = ['electric', 'barbed', 'woven', 'smooth'] as const

export const fenceRunSchema = z.strictObject({
  name: lineOfText(60),
  role: z.enum(fenceRoles),
  path: pathSchema,
  fence: z.enum(fenceKinds),
  energized: z.boolean(),
  inWater: z.boolean(),
  wires: z.number().int().min(1).max(12),
  hotWires: z.number().int().min(0).max(12).optional(),
  postSpacingFt: numberBetween(4, 120, 'ft'),
  gates: z.array(z.strictObject({ widthFt: numberBetween(3, 40, 'ft') })).max(20),
  wireKind: lineOfText(40),
})

/** Every point is held against every point of the water, so there is a limit to all runs together. */
const mostFencePoints = 1000

const pointsOf = ({ path }: z.infer<typeof fenceRunSchema>): number =>
  'points' in path ? path.points.length : 0

const fenceRunsSchema = z
  .array(fenceRunSchema)
  .min(1)
  .max(50)
  .refine(
    (runs) => runs.reduce((sum, run) => sum + pointsOf(run), 0) <= mostFencePoints,
    `All runs together may have at most ${numberText(mostFencePoints)} points; leave out those on straight stretches`,
  )

export const fencePlanSchema = z.strictObject({
  runs: fenceRunsSchema,
  nodes: z
    .array(z.strictObject({ label: lineOfText(40), existing: z.boolean() }))
    .max(100)
    .optional(),
  cornerAngleDeg: numberBetween(1, 90, 'degrees'),
  maxPullFt: numberBetween(50, 5280, 'ft'),
  rollLengthFt: z
    .record(lineOfText(40), numberBetween(50, 20000, 'ft'))
    .refine((kinds) => Object.keys(kinds).length <= 60, 'Name at most 60 kinds of wire'),
  tieOffFt: numberBetween(0, 50, 'ft').optional(),
  wastePercent: numberBetween(0, 50, 'percent'),
  energizerRule: z.enum(['fence-mile', 'hot-wire-mile']),
  groundRodLengthFt: numberBetween(4, 12, 'ft'),
  minimumGroundRods: z.number().int().min(1).max(20),
  existingEnergizedMiles: numberBetween(0, 100, 'miles').optional(),
  laneAreaFt2: numberBetween(0, 1e7, 'square feet').optional(),
})
export type FencePlan = z.infer<typeof fencePlanSchema>
