import { publishedCriteriaInput } from '../../src/districts/published-criteria-input'
import { readExample } from './example'

/** What the ids in the paths of a district's job may name. */
export interface Ids {
  job: string
  design: string
  producer: string
  packet: string
  note: string
  schedule: string
  criteriaSet: string
  costList: string
  /** A message of the job. */
  mail: string
  session: string
}

export interface RouteSample {
  /** What `:id` names. */
  id: keyof Ids
  /** What the route would take if the id were one's own. */
  body?: object
  version?: number
  hasKey?: true
}

const { job, survey } = readExample('north-pond')
const [schedule] = job.schedules
const design = { name: 'From elsewhere', plan: job.plan }
const line = { code: 'SB-01', quantityKey: 'stone-surface' }

/** For each route that names a thing: whose id, and a request that nothing but the id can stand against. */
export const routeSamples: Readonly<Record<string, RouteSample>> = {
  'DELETE /sessions/:id': { id: 'session' },
  'GET /designs/:id': { id: 'design' },
  'GET /jobs/:id': { id: 'job' },
  'GET /jobs/:id/designs': { id: 'job' },
  'GET /jobs/:id/events': { id: 'job' },
  'GET /jobs/:id/mail': { id: 'job' },
  'GET /jobs/:id/notes': { id: 'job' },
  'GET /jobs/:id/survey': { id: 'job' },
  'GET /packets/:id': { id: 'packet' },
  'GET /packets/:id/file': { id: 'packet' },
  'GET /producers/:id': { id: 'producer' },
  'GET /schedules/:id': { id: 'schedule' },
  'POST /cost-lists/:id/put-in-force': { id: 'costList', hasKey: true },
  'POST /criteria-sets/:id/put-in-force': { id: 'criteriaSet', hasKey: true },
  'POST /designs/:id/choose': { id: 'design' },
  'POST /jobs/:id/acts': { id: 'job', body: { action: 'withdraw', reason: 'Not mine.' }, hasKey: true },
  'POST /jobs/:id/calculate': { id: 'job', body: job.plan },
  'POST /jobs/:id/designs': { id: 'job', body: design },
  'POST /jobs/:id/links': { id: 'job', hasKey: true },
  'POST /jobs/:id/mail/:mailId/send-again': { id: 'job', hasKey: true },
  'POST /jobs/:id/notes': { id: 'job', body: { text: 'Not mine.' } },
  'POST /jobs/:id/packets': { id: 'job', body: { designId: crypto.randomUUID() }, hasKey: true },
  'POST /notes/:id/answer': { id: 'note', body: { text: 'Not mine.' } },
  'POST /notes/:id/settle': { id: 'note' },
  'POST /packets/:id/consent': { id: 'packet', body: { consentVersion: '2026-1', agrees: true } },
  'POST /packets/:id/make-again': { id: 'packet', hasKey: true },
  'POST /packets/:id/read-pages': { id: 'packet', body: { page: 1 } },
  'POST /packets/:id/technical-check': { id: 'packet', body: {}, hasKey: true },
  'POST /schedules/:id/put-in-force': { id: 'schedule', hasKey: true },
  'PUT /designs/:id': { id: 'design', body: design, version: 1 },
  'PUT /jobs/:id/survey': { id: 'job', body: survey, version: 1 },
  'PUT /producers/:id': { id: 'producer', body: { name: 'Taken', farmName: 'Taken' }, version: 1 },
  'PUT /schedules/:id': { id: 'schedule', body: schedule, version: 1 },
  'PUT /schedules/:id/mapping': { id: 'schedule', body: { mapping: [line] }, version: 1 },
}

export const draftCriteria = publishedCriteriaInput('2026-01-01')
export const draftCosts = job.costList
export const draftSchedule = schedule
