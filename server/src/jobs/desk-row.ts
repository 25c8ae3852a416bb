import type { JobState, PacketStatus } from 'shared'

/** A job that may wait for a person, slim, as the desk reads it. */
export interface DeskRow {
  id: string
  number: string
  title: string
  state: JobState
  stateSince: Date
  /** Opened or designed by this person. */
  isMine: boolean
  isDesigner: boolean
  designerName: string | null
  hasSurvey: boolean
  hasDesign: boolean
  /** Every part of the chosen design could be worked out. */
  isWhole: boolean
  failingChecks: number
  firstFailing: string | null
  openNotes: number
  firstNote: string | null
  revision: number | null
  packetStatus: PacketStatus | null
  packetReadyAt: Date | null
  checkedAt: Date | null
  checkWithinLimits: boolean
  hasSigned: boolean
  finalPacketReady: boolean
}
