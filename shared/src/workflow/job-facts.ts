import type { JobState } from './states.js'

/**
 * All that the guards may look at, gathered by the server under lock and sent to the client with the job,
 * so that both reach the same decision.
 */
export interface JobFacts {
  readonly jobId: string
  readonly districtId: string
  readonly state: JobState
  /** Who made the chosen design. */
  readonly designerId: string | null
  /** Everyone who ever saved it: somebody who changed one figure has designed it too. */
  readonly designerIds?: readonly string[]
  /** Producers who are paid by this job, and their kin as recorded. */
  readonly payeeAndKinIds: readonly string[]
  /** Packet A of the chosen design as it stands now; null when there is none or the design moved on. */
  readonly packetA: { readonly id: string; readonly sha256: string | null } | null
  readonly technicalCheck: { readonly checkerId: string; readonly withinLimits: boolean } | null
  readonly failingChecksWithoutVariance: number
  readonly openNotes: number
  readonly landownerAddressKnown: boolean
  readonly requiredSignerIds: readonly string[]
  readonly signedByIds: readonly string[]
  readonly consentedIds: readonly string[]
  /** Those who have opened every page of packet A. */
  readonly hasReadIds: readonly string[]
  readonly budgetLeft: boolean
  readonly packetB: { readonly id: string; readonly sha256: string | null } | null
  readonly permitsRecorded: boolean
  readonly utilityTicketRecorded: boolean
  readonly everyQuantityMeasured: boolean
  readonly ticketsMatch: boolean
  readonly measurerId: string | null
  readonly certifierIds: readonly string[]
  readonly changeOrderOpen: boolean
  readonly finalPaymentWithinPayable: boolean
  readonly inspectionDatesSet: boolean
  /** May one person both check and approve? A district setting. */
  readonly checkerMayApprove: boolean
}

/** What comes with an act. */
export interface ActRequest {
  readonly packetSha256?: string
  readonly note?: string
  readonly notes?: number
  readonly reason?: string
  readonly addressConfirmed?: boolean
}
