import type { JobAction, JobView, PacketView } from 'shared'
import { sentenceKey } from './shared-sentences'

export interface SigningSteps {
  /** Everything the workflow asks but the steps a landowner takes on these pages. */
  isMyTurn: boolean
  hasConsented: boolean
  unreadPages: number[]
  /** Other sentences of the server that block the signature. */
  otherReasons: string[]
}

const ownSteps: readonly (string | null)[] = ['reasons.consentMissing', 'reasons.readMissing']

export const offeredAct = (job: JobView, action: JobAction) =>
  job.actions.find((offered) => offered.action === action)

/** What a landowner has done, and still has to do, before this packet can be signed. */
export function signingSteps(job: JobView, packet: PacketView): SigningSteps {
  const sign = offeredAct(job, 'sign')
  const otherReasons = (sign?.reasons ?? []).filter((reason) => !ownSteps.includes(sentenceKey(reason)))
  return {
    isMyTurn: sign !== undefined && otherReasons.length === 0 && packet.status === 'ready',
    hasConsented: packet.iHaveConsented,
    unreadPages: packet.pages
      .map(({ number }) => number)
      .filter((number) => !packet.pagesReadByMe.includes(number)),
    otherReasons,
  }
}
