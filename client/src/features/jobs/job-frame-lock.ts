import { edges, stateWords, type JobState, type JobView, type Permission } from 'shared'
import { useMay } from '../../api/session-context'

/** What has not been sent to the landowner can still change; the workflow says where a job may be sent from. */
const isBeforeSending = (state: JobState): boolean =>
  edges.some(({ action, from }) => action === 'send-to-landowner' && from.includes(state))

/** Why this person cannot change the survey or a design of this job now; null when nothing is in the way. */
export function useJobFrameLock(job: Pick<JobView, 'state'>, permission: Permission): string | null {
  const may = useMay()
  if (!may(permission)) return 'You can read this, but only a planner of the district changes it.'
  if (isBeforeSending(job.state)) return null
  return `A job that is ${stateWords[job.state]} cannot be changed. It must be returned first.`
}
