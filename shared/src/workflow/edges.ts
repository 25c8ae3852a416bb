import type { GuardName } from './guards.js'
import type { JobFacts } from './job-facts.js'
import type { Role } from './roles.js'
import type { JobState } from './states.js'

export const jobActions = [
  'send-to-landowner',
  'sign',
  'ask-for-changes',
  'take-signature-back',
  'approve',
  'return',
  'send',
  'start-building',
  'finish-check-out',
  'certify',
  'return-to-building',
  'record-final-payment',
  'put-in-service',
  'end',
  'stop',
  'withdraw',
] as const

export type JobAction = (typeof jobActions)[number]

export interface Edge {
  readonly from: readonly JobState[]
  readonly action: JobAction
  readonly to: JobState
  /** Where the edge ends instead while others still have to act; the act itself is recorded either way. */
  readonly toWhile?: { readonly to: JobState; readonly holds: (facts: JobFacts, actorId: string) => boolean }
  readonly roles: readonly Role[]
  readonly guards: readonly GuardName[]
}

const othersStillSign = (facts: JobFacts, actorId: string): boolean =>
  facts.requiredSignerIds.some((id) => id !== actorId && !facts.signedByIds.includes(id))

/** Every way a job can move. What is not listed here is refused. */
export const edges: readonly Edge[] = [
  {
    from: ['draft', 'returned'],
    action: 'send-to-landowner',
    to: 'with-landowner',
    roles: ['planner'],
    guards: [
      'packetRendered',
      'technicallyChecked',
      'checkerDidNotDesign',
      'checkerWithinLimits',
      'noFailingCheck',
      'noOpenNote',
      'landownerReachable',
    ],
  },
  {
    from: ['with-landowner'],
    action: 'sign',
    to: 'with-supervisor',
    toWhile: { to: 'with-landowner', holds: othersStillSign },
    roles: ['landowner'],
    guards: ['isSigner', 'signerIsNoJudge', 'notSignedYet', 'hasConsented', 'hasRead', 'hashMatches'],
  },
  {
    from: ['with-landowner'],
    action: 'ask-for-changes',
    to: 'returned',
    roles: ['landowner'],
    guards: ['isSigner', 'hasNote'],
  },
  {
    from: ['with-supervisor'],
    action: 'take-signature-back',
    to: 'returned',
    roles: ['landowner'],
    guards: ['hasSigned', 'hasReason'],
  },
  {
    from: ['with-supervisor'],
    action: 'approve',
    to: 'approved',
    roles: ['supervisor'],
    guards: [
      'notDesigner',
      'notPayeeOrKin',
      'checkerMayDecide',
      'signaturesStand',
      'budgetLeft',
      'hashMatches',
    ],
  },
  {
    from: ['with-supervisor'],
    action: 'return',
    to: 'returned',
    roles: ['supervisor'],
    guards: ['notPayeeOrKin', 'hasNotes'],
  },
  {
    from: ['approved'],
    action: 'send',
    to: 'sent',
    roles: ['office'],
    guards: ['finalPacketReady', 'addressConfirmed'],
  },
  {
    from: ['sent'],
    action: 'start-building',
    to: 'building',
    roles: ['planner'],
    guards: ['permitsRecorded', 'utilityTicketRecorded'],
  },
  {
    from: ['building'],
    action: 'finish-check-out',
    to: 'built',
    roles: ['planner'],
    guards: ['allMeasured', 'ticketsMatch'],
  },
  {
    from: ['built'],
    action: 'certify',
    to: 'certified',
    roles: ['planner', 'supervisor'],
    guards: ['mayCertify', 'notMeasurer', 'notDesigner', 'notPayeeOrKin', 'noChangeOrderOpen'],
  },
  {
    from: ['built'],
    action: 'return-to-building',
    to: 'building',
    roles: ['planner', 'supervisor'],
    guards: ['mayCertify', 'notMeasurer', 'hasNotes'],
  },
  {
    from: ['certified'],
    action: 'record-final-payment',
    to: 'paid',
    roles: ['office'],
    guards: ['withinPayable'],
  },
  {
    from: ['paid'],
    action: 'put-in-service',
    to: 'in-service',
    roles: ['office'],
    guards: ['inspectionDatesSet'],
  },
  { from: ['in-service'], action: 'end', to: 'ended', roles: ['supervisor'], guards: ['hasReason'] },
  { from: ['sent', 'building'], action: 'stop', to: 'stopped', roles: ['supervisor'], guards: ['hasReason'] },
  {
    from: ['draft', 'returned', 'with-landowner', 'with-supervisor'],
    action: 'withdraw',
    to: 'withdrawn',
    roles: ['planner', 'landowner'],
    guards: ['hasReason'],
  },
]
