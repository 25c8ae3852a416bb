import PDFDocument from 'pdfkit'
import type { PacketDocument, PacketPage } from '../packet-document.js'
import { POINTS_PER_MM } from '../theme.js'
import { structureOf } from './draw-nodes.js'
import { drawShapes } from './draw-shapes.js'
import { fonts } from './fonts.js'
import { shareLayouts } from './share-layouts.js'

type Doc = PDFKit.PDFDocument

/** A document as a tagged PDF. The same document gives the same bytes: it carries its own date. */
export function renderPacket(packet: PacketDocument): Promise<Uint8Array> {
  const made = new Date(packet.madeAt)
  const doc = new PDFDocument({
    autoFirstPage: false,
    margin: 0,
    font: fonts.regular,
    tagged: true,
    lang: packet.language,
    displayTitle: true,
    pdfVersion: '1.7',
    subset: 'PDF/A-2a',
    info: {
      Title: packet.title,
      Author: packet.author,
      Subject: packet.subject,
      Creator: 'Wadestone',
      Producer: 'Wadestone',
      CreationDate: made,
      ModDate: made,
    },
  })
  Object.values(fonts).forEach((face) => shareLayouts(doc, face))
  const bytes = collect(doc)
  const whole = doc.struct('Document')
  doc.addStructure(whole)
  packet.pages.forEach((page) => drawPage(doc, page, whole))
  whole.end()
  doc.end()
  return bytes
}

function collect(doc: Doc): Promise<Uint8Array> {
  const chunks: Buffer[] = []
  return new Promise((resolve, reject) => {
    doc.on('data', (chunk: Buffer) => chunks.push(chunk))
    doc.on('end', () => resolve(new Uint8Array(Buffer.concat(chunks))))
    doc.on('error', reject)
  })
}

function drawPage(doc: Doc, page: PacketPage, whole: PDFKit.PDFStructureElement): void {
  doc.addPage({ size: [page.widthMm * POINTS_PER_MM, page.heightMm * POINTS_PER_MM], margin: 0 })
  doc.outline.addItem(page.title)
  doc.lineJoin('round')
  // Bands, rules, head and foot are no part of what is read aloud.
  doc.markContent('Artifact', { type: 'Layout' })
  drawShapes(doc, page.art)
  doc.endMarkedContent()
  whole.add(
    doc.struct(
      'Sect',
      {},
      page.nodes.map((one) => structureOf(doc, one)),
    ),
  )
  doc.markContent('Artifact', { type: 'Pagination' })
  drawShapes(doc, page.furniture)
  doc.endMarkedContent()
}
