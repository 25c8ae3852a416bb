import type { JobState, Role } from 'shared'
import type { DeskRow } from './desk-row.js'

/** For whom a job waits, in which words, and where the button leads. The first rule that holds for a job is its line. */
export interface DeskRule {
  roles: readonly Role[]
  states: readonly JobState[]
  holds: (row: DeskRow) => boolean
  sentence: (row: DeskRow) => string
  nextAct: string
  path: (jobId: string) => string
  since: (row: DeskRow) => Date
}

const counted = (count: number, one: string, many: string): string => `${count} ${count === 1 ? one : many}`
const quoted = (text: string | null): string => (text === null ? '' : ` "${shortened(text)}"`)
const shortened = (text: string): string => (text.length > 140 ? `${text.slice(0, 139)}…` : text)
const revisionOf = (row: DeskRow): string => `Revision ${row.revision ?? ''}`.trim()

const planning: Pick<DeskRule, 'roles' | 'states' | 'since'> = {
  roles: ['planner'],
  states: ['draft', 'returned'],
  since: (row) => row.stateSince,
}

const below = (place: string) => (jobId: string) => `/jobs/${jobId}/${place}`
const isReady = (row: DeskRow): boolean => row.packetStatus === 'ready'

export const deskRules: readonly DeskRule[] = [
  {
    ...planning,
    holds: (row) => row.isMine && row.openNotes > 0,
    sentence: (row) =>
      `${row.state === 'returned' ? 'Returned with' : 'There are'} ${counted(row.openNotes, 'open note', 'open notes')}.${quoted(row.firstNote)}`,
    nextAct: 'Answer the notes',
    path: below('notes'),
  },
  {
    ...planning,
    holds: (row) => row.isMine && !row.hasSurvey,
    sentence: () => 'The bank has not been surveyed yet.',
    nextAct: 'Enter the level notes',
    path: below('survey'),
  },
  {
    ...planning,
    holds: (row) => row.isMine && !row.hasDesign,
    sentence: () => 'The bank is surveyed; no design is chosen yet.',
    nextAct: 'Begin the design',
    path: below('design'),
  },
  {
    ...planning,
    holds: (row) => row.isMine && !row.isWhole,
    sentence: () => 'Parts of the design cannot be worked out yet.',
    nextAct: 'Finish the design',
    path: below('design'),
  },
  {
    ...planning,
    holds: (row) => row.isMine && row.failingChecks > 0,
    sentence: (row) =>
      `${counted(row.failingChecks, 'check fails', 'checks fail')} in your draft: ${row.firstFailing ?? ''}.`,
    nextAct: 'Open the checks',
    path: below('checks'),
  },
  {
    ...planning,
    holds: (row) => row.isMine && (row.packetStatus === null || row.packetStatus === 'failed'),
    sentence: (row) =>
      row.packetStatus === 'failed'
        ? 'The packet could not be made. Make it again.'
        : 'Every figure is worked out and every check holds.',
    nextAct: 'Make the packet',
    path: below('packet'),
  },
  {
    ...planning,
    holds: (row) => row.isMine && isReady(row) && row.checkedAt !== null && row.checkWithinLimits,
    sentence: (row) => `${revisionOf(row)} is checked.`,
    nextAct: 'Send to landowner',
    path: below('packet'),
    since: (row) => row.checkedAt ?? row.stateSince,
  },
  {
    roles: ['planner', 'supervisor'],
    states: ['draft', 'returned'],
    holds: (row) => isReady(row) && row.checkedAt === null && !row.isDesigner,
    sentence: (row) =>
      `${revisionOf(row)} by ${row.designerName ?? 'another planner'} needs a technical check.`,
    nextAct: 'Check the figures',
    path: below('packet'),
    since: (row) => row.packetReadyAt ?? row.stateSince,
  },
  {
    roles: ['supervisor'],
    states: ['with-supervisor'],
    holds: (row) => !row.isDesigner,
    sentence: (row) => `${revisionOf(row)} is signed and waits for your decision.`,
    nextAct: 'Approve or return',
    path: below('review'),
    since: (row) => row.stateSince,
  },
  {
    roles: ['office'],
    states: ['approved'],
    holds: () => true,
    sentence: (row) =>
      row.finalPacketReady
        ? `${revisionOf(row)} is approved and its packet is ready.`
        : `${revisionOf(row)} is approved; its packet is being made.`,
    nextAct: 'Send the packet',
    path: below('send'),
    since: (row) => row.stateSince,
  },
  {
    roles: ['landowner'],
    states: ['with-landowner'],
    holds: (row) => !row.hasSigned,
    sentence: () => 'The packet of your ramp is ready for you to read.',
    nextAct: 'Read and sign',
    path: (jobId) => `/my/${jobId}`,
    since: (row) => row.stateSince,
  },
]
