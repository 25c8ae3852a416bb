import { z } from 'zod'
import { costListInputSchema } from './cost-list.js'
import { designPlanSchema } from './design-plan.js'
import { jobInputSchema } from './job.js'
import { elevationFt, levelClosingSchema } from './level-notes.js'
import { producerInputSchema } from './person.js'
import { paragraph } from './primitives.js'
import { scheduleInputSchema } from './schedule.js'
import { settingValueSchema } from './settings.js'

/** A whole job as a file: what the tour takes. The level notes stand beside it as CSV. */
export const exampleJobSchema = z.strictObject({
  inputVersion: z.literal(1),
  settings: z.array(settingValueSchema).min(1),
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
  landownerAsks: paragraph(2000),
  plannerAnswers: paragraph(2000),
  supervisorAsks: paragraph(2000),
})

export type ExampleJob = z.infer<typeof exampleJobSchema>
