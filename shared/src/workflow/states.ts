/** Where a job stands. The words a person reads come from `stateWords`. */
export const jobStates = [
  'draft',
  'returned',
  'with-landowner',
  'with-supervisor',
  'approved',
  'sent',
  'building',
  'built',
  'certified',
  'paid',
  'in-service',
  'ended',
  'stopped',
  'withdrawn',
] as const

export type JobState = (typeof jobStates)[number]

export const endStates: readonly JobState[] = ['ended', 'stopped', 'withdrawn']

export const stateWords: Record<JobState, string> = {
  draft: 'draft',
  returned: 'returned',
  'with-landowner': 'with landowner',
  'with-supervisor': 'with supervisor',
  approved: 'approved',
  sent: 'sent',
  building: 'building',
  built: 'built',
  certified: 'certified',
  paid: 'paid',
  'in-service': 'in service',
  ended: 'ended',
  stopped: 'stopped',
  withdrawn: 'withdrawn',
}
