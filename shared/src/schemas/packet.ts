import { z } from 'zod'
import {
  civilDateSchema,
  idSchema,
  lineOfText,
  numberBetween,
  paragraph,
  sha256Schema,
} from './primitives.js'

const pageNumber = z.number().int().min(1).max(200)

export const makePacketSchema = z.strictObject({ designId: idSchema })

export const packetStatuses = ['waiting', 'making', 'ready', 'failed'] as const
export type PacketStatus = (typeof packetStatuses)[number]

export interface PacketView {
  id: string
  jobId: string
  kind: 'A' | 'B'
  revision: number
  status: PacketStatus
  sha256: string | null
  sizeBytes: number | null
  pages: { number: number; title: string; text: string[] }[]
  pagesReadByMe: number[]
  iHaveConsented: boolean
  technicalCheck: { by: string; at: string; note: string | null; withinLimits: boolean } | null
  signatures: { name: string; signedAt: string; isVoid: boolean }[]
}

export const technicalCheckSchema = z.strictObject({ note: paragraph(2000).optional() })

export const readPageSchema = z.strictObject({ page: pageNumber })

export const consentSchema = z.strictObject({
  consentVersion: z.literal('2026-1'),
  agrees: z.literal(true, 'Tick the box to agree, or ask for paper'),
})

export const noteInputSchema = z.strictObject({
  packetId: idSchema.optional(),
  page: pageNumber.optional(),
  xMm: numberBetween(0, 2000, 'mm').optional(),
  yMm: numberBetween(0, 2000, 'mm').optional(),
  text: paragraph(4000),
})

export const noteAnswerSchema = z.strictObject({ text: paragraph(4000) })

export type NoteInput = z.infer<typeof noteInputSchema>

export interface NoteView extends NoteInput {
  id: string
  jobId: string
  revision: number | null
  author: string
  authorId: string
  at: string
  status: 'open' | 'answered' | 'settled'
  answers: { author: string; at: string; text: string }[]
}

const reason = paragraph(2000)

/** What comes with each act that moves a job. */
export const actSchema = z.discriminatedUnion('action', [
  z.strictObject({ action: z.literal('send-to-landowner') }),
  z.strictObject({
    action: z.literal('sign'),
    typedName: lineOfText(120),
    intends: z.literal(true, 'Tick that you mean this as your signature'),
    packetSha256: sha256Schema,
  }),
  z.strictObject({
    action: z.literal('ask-for-changes'),
    note: reason,
    page: pageNumber.optional(),
  }),
  z.strictObject({ action: z.literal('take-signature-back'), reason }),
  z.strictObject({
    action: z.literal('approve'),
    packetSha256: sha256Schema,
    meetingDate: civilDateSchema.optional(),
    agendaItem: lineOfText(60).optional(),
  }),
  z.strictObject({
    action: z.literal('return'),
    notes: z.array(reason).min(1, 'Write at least one note').max(50),
  }),
  z.strictObject({ action: z.literal('send'), addressConfirmed: z.boolean() }),
  z.strictObject({ action: z.literal('withdraw'), reason }),
])

export type Act = z.infer<typeof actSchema>

export interface MailView {
  id: string
  kind: string
  to: string
  subject: string
  messageId: string
  status: 'waiting' | 'sent' | 'failed'
  attempts: number
  queuedAt: string
  sentAt: string | null
  lastError: string | null
  /** It carried a way in, so its text is gone; a new link takes its place. */
  isSecret: boolean
  attachment: { filename: string; sha256: string } | null
}
