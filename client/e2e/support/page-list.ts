import type { DesignView, JobList, JobState, Role, ScheduleListItem } from 'shared'
import { ApiPerson } from './api-person'
import { signInOf } from './sign-ins'

const ofEverybody = ['/desk', '/account', '/no/such/page']
const ofDistrict = ['/schedules', '/cost-lists', '/settings', '/people']
const ofJobs = ['/jobs', '/producers']
const ofEveryJob = [
  '',
  '/survey',
  '/design',
  '/figures',
  '/checks',
  '/cost-share',
  '/packet',
  '/notes',
  '/timeline',
]
const newThings = ['/schedules/new', '/cost-lists/new']

interface FoundIds {
  schedule: string
  draft: string
  withLandowner: string
  withSupervisor: string
  sent: string
  design: string
}

async function findIds(): Promise<FoundIds> {
  const planner = await ApiPerson.signedIn(signInOf('planner'))
  const jobIn = async (state: JobState): Promise<string> => {
    const { jobs } = await planner.get<JobList>(`/jobs?state=${state}`)
    // The oldest are the example jobs; tests of other stories only add newer ones.
    const found = jobs.at(-1)
    if (found === undefined) throw new Error(`The example district has no job in the state ${state}.`)
    return found.id
  }
  const withLandowner = await jobIn('with-landowner')
  const draft = await jobIn('draft')
  const { jobs } = await planner.get<JobList>('/jobs?find=Abernethy')
  const [design] = await planner.get<DesignView[]>(`/jobs/${jobs[0]?.id}/designs`)
  const [schedule] = await planner.get<ScheduleListItem[]>('/schedules')
  return {
    draft,
    withLandowner,
    withSupervisor: await jobIn('with-supervisor'),
    sent: await jobIn('sent'),
    design: `/jobs/${jobs[0]?.id}/design/${design?.id}`,
    schedule: schedule?.id ?? '',
  }
}

const jobPages = (id: string, pages: readonly string[]): string[] => pages.map((page) => `/jobs/${id}${page}`)

/** Addresses of every page that a role of the district reaches, on example jobs in several states. */
export async function pagesOf(role: Exclude<Role, 'landowner'>): Promise<string[]> {
  const { schedule, draft, withLandowner, withSupervisor, sent, design } = await findIds()
  const district = [...ofEverybody, ...ofDistrict, `/schedules/${schedule}`]
  const signed = jobPages(withSupervisor, [...ofEveryJob, '/review'])
  const pages: Record<typeof role, string[]> = {
    administrator: [...district, ...newThings, '/people/new'],
    office: [
      ...district,
      ...newThings,
      ...ofJobs,
      '/producers/new',
      ...jobPages(sent, [...ofEveryJob, '/send']),
    ],
    supervisor: [...district, ...ofJobs, ...signed, ...jobPages(withLandowner, ['/review'])],
    planner: [
      ...district,
      ...ofJobs,
      '/producers/new',
      '/jobs/new',
      ...signed,
      ...jobPages(withSupervisor, ['/send']),
      ...jobPages(draft, ['', '/survey', '/packet']),
      ...['ramp', 'fence', 'funding'].map((part) => `${design}/${part}`),
    ],
  }
  return pages[role]
}

/** What a landowner opens of a job that waits for the signature. */
export const landownerPages = (jobId: string): string[] =>
  ['', '/read/1', '/read/3', '/sign', '/ask', '/withdraw'].map((page) => `/my/${jobId}${page}`)
