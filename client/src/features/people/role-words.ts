import type { Role } from 'shared'

/** What each kind of staff does, in one line. Producers come by themselves, with a mailed link. */
export const staffRoles: readonly { role: Exclude<Role, 'landowner'>; does: string }[] = [
  { role: 'planner', does: 'makes jobs, surveys, designs and packets' },
  { role: 'supervisor', does: 'approves packets for the board, or returns them' },
  { role: 'office', does: 'sends packets, keeps schedules and unit costs' },
  { role: 'administrator', does: 'keeps people and settings' },
]
