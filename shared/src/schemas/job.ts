import { z } from 'zod'
import type { OfferedAction } from '../workflow/actions-for.js'
import { jobStates, type JobState } from '../workflow/states.js'
import { waterBodySchema } from './design-plan.js'
import { idSchema, lineOfText, lineOrEmpty } from './primitives.js'

export const jobInputSchema = z.strictObject({
  title: lineOfText(120),
  producerIds: z.array(idSchema).min(1, 'A job has at least one producer').max(10),
  body: waterBodySchema,
  waterName: lineOfText(120),
  county: lineOfText(80),
  farmNumber: lineOfText(30).optional(),
  tractNumber: lineOfText(30).optional(),
  fieldNumber: lineOfText(30).optional(),
  legalDescription: lineOfText(200).optional(),
})

export const jobListQuerySchema = z.strictObject({
  state: z.enum(jobStates).optional(),
  find: lineOrEmpty(100).optional(),
  cursor: z
    .string()
    .max(400)
    .regex(/^[\w.=-]*$/, 'Take the cursor as the list before gave it')
    .optional(),
  limit: z.coerce.number().int().min(1).max(100).optional(),
})

export type JobInput = z.infer<typeof jobInputSchema>
export type JobListQuery = z.infer<typeof jobListQuerySchema>

export interface JobListItem {
  id: string
  number: string
  title: string
  producerNames: string[]
  body: JobInput['body']
  state: JobState
  waitsFor: string
  updatedAt: string
  gradeRunPerRise: number | null
  stoneOrderTons: number | null
  landownerShare: string | null
}

export interface JobList {
  jobs: JobListItem[]
  nextCursor: string | null
}

/** One line of the desk: a job that waits for this person, with the next act. */
export interface DeskItem {
  jobId: string
  number: string
  title: string
  state: JobState
  sentence: string
  nextAct: string
  /** Where the button leads, as a path of the client. */
  path: string
  waitingSince: string
}

export interface RevisionItem {
  number: number
  packetId: string
  madeAt: string
  sha256: string | null
  /** Signatures of an older revision are void, and say so. */
  signatures: { name: string; signedAt: string; isVoid: boolean }[]
}

export interface JobView extends Omit<JobInput, 'producerIds'> {
  id: string
  number: string
  state: JobState
  version: number
  producers: { id: string; name: string; farmName: string }[]
  designerName: string | null
  chosenDesignId: string | null
  hasSurvey: boolean
  packetId: string | null
  finalPacketId: string | null
  openNotes: number
  revisions: RevisionItem[]
  actions: OfferedAction[]
  waitsFor: string
  updatedAt: string
}

/** One line of the timeline. Names are resolved when it is read; the stored event holds ids only. */
export interface EventView {
  sequence: number
  kind: string
  at: string
  who: string | null
  sentence: string
  rowHash: string
}
