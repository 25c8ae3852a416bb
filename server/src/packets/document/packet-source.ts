import type { DesignPlan, DesignResult, JobInput, SettingValue, SurveyView } from 'shared'
import type { SignatureMethod } from '../../signatures/signature.entity.js'

export interface PacketProducer {
  name: string
  farmName: string
  addressLines: string[]
}

export interface PacketSchedule {
  key: string
  name: string
  fiscalYear: number
  effectiveFrom: string
  effectiveTo: string
}

/** A missed check that somebody took upon himself. */
export interface PacketVariance {
  checkId: string
  reason: string
  by: string
  /** Instant. */
  at: string
}

/** All that a packet is made of, frozen: nothing is looked up, and no clock is read, after this point. */
export interface PacketSource {
  district: { name: string; addressLines: string[]; timeZone: string; isDemo: boolean }
  job: {
    number: string
    title: string
    body: JobInput['body']
    waterName: string
    county: string
    farmNumber?: string
    tractNumber?: string
    fieldNumber?: string
    legalDescription?: string
  }
  producers: PacketProducer[]
  designerName: string
  revision: number
  /** The instant at which the revision was made; it dates the document. */
  madeAt: string
  survey: Pick<SurveyView, 'survey' | 'groundLine' | 'reduction'>
  plan: DesignPlan
  result: DesignResult
  criteriaSet: { name: string; effectiveFrom: string } | null
  costList: { name: string; effectiveFrom: string; source: string } | null
  schedules: PacketSchedule[]
  settings: SettingValue[]
  variances: PacketVariance[]
}

export type { SignatureMethod }

export interface PacketSignature {
  /** Of the person the district knows. */
  name: string
  typedName: string
  /** Instant. */
  signedAt: string
  method: SignatureMethod
  consentVersion: string
  ip: string
  userAgent: string
}

/** What packet B adds to packet A. */
export interface PacketEvidence {
  packetASha256: string
  signatures: PacketSignature[]
  technicalCheck: { by: string; at: string; withinLimits: boolean; note: string | null } | null
  approval: { name: string; at: string; meetingDate?: string; agendaItem?: string }
  eventChain: { sequence: number; rowHash: string }
}
