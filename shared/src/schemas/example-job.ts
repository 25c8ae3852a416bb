import { z } from 'zod'
import { costListInputSchema } from './cost-list.js'
import { designPlanSchema } from './design-plan.js'
import { jobInputSchema } from './job.js'
import { elevationFt, levelClosingSchema } from './level-notes.js'
import { producerInputSchema } from './person.js'
import { lineOfText, numberBetween, paragraph } from './primitives.js'
import { scheduleInputSchema } from './schedule.js'
import { settingValueSchema } from './settings.js'

/** What a reader asks for, and what the planner then changes in the plan. */
const askedChangeSchema = z.strictObject({
  note: paragraph(2000),
  page: z.number().int().min(1).max(200).optional(),
  change: z
    .array(
      z.strictObject({
        path: z.string().regex(/^(\/[\w-]+)+$/, 'Name the value by its path, such as /ramp/widthFt'),
        value: z.union([numberBetween(-1e9, 1e9, ''), lineOfText(200), z.boolean()]),
      }),
    )
    .min(1)
    .max(20),
})

/** A whole job as a file: what the tour takes. The level notes stand beside it as CSV. */
export const exampleJobSchema = z.strictObject({
  inputVersion: z.literal(1),
  settings: z.array(settingValueSchema).min(1).max(100),
  costList: costListInputSchema,
  schedules: z.array(scheduleInputSchema).min(1).max(8),
  producer: producerInputSchema.required({ email: true }),
  job: jobInputSchema.omit({ producerIds: true }),
  survey: z.strictObject({
    /** Name of the CSV file with the level notes, beside this file. */
    notesFile: z.string().regex(/^[\w.-]+\.csv$/, 'Name a CSV file beside this file'),
    startElevationFt: elevationFt,
    waterSurfaceFt: elevationFt,
    closing: levelClosingSchema.optional(),
  }),
  plan: designPlanSchema,
  landownerAsks: askedChangeSchema,
  plannerAnswersLandowner: paragraph(2000),
  supervisorAsks: askedChangeSchema,
  plannerAnswersSupervisor: paragraph(2000),
})

export type ExampleJob = z.infer<typeof exampleJobSchema>
