import type { JobState } from 'shared'

/** What a job waits for, as it stands in the table of jobs and after "It waits for:". */
export const waitsFor: Record<JobState, string> = {
  draft: "the planner's packet",
  returned: "the planner's answer",
  'with-landowner': "the landowner's signature",
  'with-supervisor': "the supervisor's approval",
  approved: 'the office to send it',
  sent: 'the start of building',
  building: 'the check-out',
  built: 'the certification',
  certified: 'the final payment',
  paid: 'the inspection dates',
  'in-service': 'the next inspection',
  ended: 'nothing',
  stopped: 'nothing',
  withdrawn: 'nothing',
}
