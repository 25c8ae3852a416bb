import type { Shape, TextShape } from 'shared'

export const packetDocumentVersion = 1

/** A node of the page's structure, in reading order: what a screen reader walks. */
export interface PageNode {
  tag: 'H1' | 'H2' | 'P' | 'L' | 'LI' | 'Lbl' | 'LBody' | 'Div' | 'Table' | 'TR' | 'TH' | 'TD' | 'Figure'
  texts: TextShape[]
  children: PageNode[]
  /** Whether a head cell heads its column or its row. */
  scope?: 'Column' | 'Row'
  /** What a figure shows, in words. */
  alt?: string
  /** The drawing of a figure. */
  shapes?: Shape[]
}

export interface PacketPage {
  /** As printed on the page, such as "Page 3 of 16". */
  label: string
  title: string
  /** The page in plain lines, for reading on a screen. */
  text: string[]
  widthMm: number
  heightMm: number
  /** Rules and bands without meaning of their own, drawn first. */
  art: Shape[]
  /** Running head, foot and page number: read by eyes only. */
  furniture: TextShape[]
  nodes: PageNode[]
}

/** A packet with every string and number ready and in its place. It is stored, and never worked out again. */
export interface PacketDocument {
  version: typeof packetDocumentVersion
  kind: 'A' | 'B'
  title: string
  subject: string
  author: string
  language: 'en-US'
  /** Instant that dates the file; the same source gives the same bytes. */
  madeAt: string
  /** What withEvidence needs to print further pages like these. */
  frame: PageFrame
  pages: PacketPage[]
}

export interface PageFrame {
  district: string
  timeZone: string
  jobTitle: string
  jobNumber: string
  revision: number
  isExample: boolean
}
