import { polyline, roundSheet, type Sheet } from 'shared'
import { node } from './layout/piece.js'
import type { LaidPage } from './layout/paginate.js'
import type { PacketPage, PageFrame, PageNode } from './packet-document.js'
import { exampleBand, pageFurniture } from './page-furniture.js'
import { textPage } from './theme.js'

/** A page of text with its head and foot. */
export function textPageOf(laid: LaidPage, frame: PageFrame, label: string): PacketPage {
  const paper = { widthMm: textPage.widthMm, heightMm: textPage.heightMm, isSheet: false }
  const headRule = polyline(
    [
      { x: textPage.leftMm, y: 18 },
      { x: textPage.widthMm - textPage.rightMm, y: 18 },
    ],
    { tone: 'hairline', widthMm: 0.25 },
  )
  return {
    label,
    title: laid.title,
    text: laid.nodes.flatMap(linesOf),
    widthMm: paper.widthMm,
    heightMm: paper.heightMm,
    art: [...exampleBand(frame, paper), headRule, ...laid.art],
    furniture: pageFurniture(frame, label, paper),
    nodes: laid.nodes,
  }
}

/** A page that is one drawing, with the same figures in words for those who read. */
export function sheetPageOf(sheet: Sheet, frame: PageFrame, label: string): PacketPage {
  const { shapes, words, title, widthMm, heightMm } = roundSheet(sheet)
  const paper = { widthMm, heightMm, isSheet: true }
  return {
    label,
    title,
    text: words,
    widthMm,
    heightMm,
    art: [],
    furniture: pageFurniture(frame, label, paper),
    nodes: [node('Figure', { alt: [title, ...words].join('. '), shapes })],
  }
}

/** A page's structure as plain lines: a row or a list item is one line. */
function linesOf(one: PageNode): string[] {
  if (one.tag === 'Table' || one.tag === 'L' || one.tag === 'Div') return one.children.flatMap(linesOf)
  if (one.tag === 'TR') return [one.children.map(wordsOf).filter(Boolean).join(' · ')]
  const words = wordsOf(one)
  return words ? [words] : []
}

function wordsOf(one: PageNode): string {
  const own = one.texts.map(({ text }) => text)
  return [...own, ...one.children.map(wordsOf), ...(one.alt ? [one.alt] : [])].filter(Boolean).join(' ')
}
