import type { JobState, PacketView } from 'shared'

/** The states a job can reach with what a district records today. */
export const demoStates = [
  'draft',
  'returned',
  'with-landowner',
  'with-supervisor',
  'approved',
  'sent',
  'withdrawn',
] as const satisfies readonly JobState[]

export type DemoState = (typeof demoStates)[number]

export type DemoAct = 'check' | 'invite' | 'ask-for-changes' | 'sign' | 'approve' | 'send' | 'withdraw'

/** A part of a job's way: once the packet is made the acts follow in one transaction, so none stands half done. */
export interface Stretch {
  from: DemoState
  packet: PacketView['kind'] | null
  acts: readonly DemoAct[]
}

const checked = (...acts: DemoAct[]): Stretch => ({
  from: 'draft',
  packet: 'A',
  acts: ['check', 'invite', ...acts],
})

const afterApproval = (...acts: DemoAct[]): Stretch => ({ from: 'approved', packet: 'B', acts })

export const pathTo: Readonly<Record<DemoState, readonly Stretch[]>> = {
  draft: [],
  withdrawn: [{ from: 'draft', packet: null, acts: ['withdraw'] }],
  'with-landowner': [checked()],
  returned: [checked('ask-for-changes')],
  'with-supervisor': [checked('sign')],
  approved: [checked('sign', 'approve'), afterApproval()],
  sent: [checked('sign', 'approve'), afterApproval('send')],
}
