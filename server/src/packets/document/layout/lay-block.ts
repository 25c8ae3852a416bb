import { polyline, type Shape } from 'shared'
import { gaps, type } from '../theme.js'
import type { Block } from './block.js'
import { layContents } from './lay-contents.js'
import { layFacts } from './lay-facts.js'
import { layFigures } from './lay-figures.js'
import { layLines, linesHeight } from './lay-lines.js'
import { layList } from './lay-list.js'
import { layTable } from './lay-table.js'
import { node, type Piece } from './piece.js'

type Kind = Block['kind']
type Layers = {
  [kind in Kind]: (block: Extract<Block, { kind: kind }>, widthMm: number, id: string) => Piece[]
}

const layers: Layers = {
  heading: ({ text }, widthMm) => {
    const style = { ...type.heading, weight: 'bold' as const }
    const texts = layLines({ text, xMm: 0, widthMm, style })
    const heightMm = linesHeight(texts, style)
    return [{ heightMm, gapBeforeMm: gaps.heading, node: node('H2', { texts }), art: [], keepWithNext: true }]
  },
  paragraph: ({ text, tone, weight, size = 'text' }, widthMm) => {
    const style = { ...type[size], ...(tone ? { tone } : {}), ...(weight ? { weight } : {}) }
    const texts = layLines({ text, xMm: 0, widthMm, style })
    return [
      { heightMm: linesHeight(texts, style), gapBeforeMm: gaps.block, node: node('P', { texts }), art: [] },
    ]
  },
  list: layList,
  facts: layFacts,
  figures: layFigures,
  table: layTable,
  signature: ({ role, name }, widthMm) => [signaturePiece(role, name, widthMm)],
  picture: ({ heightMm, alt, draw }, widthMm) => [
    { heightMm, gapBeforeMm: gaps.block, node: node('Figure', { alt, shapes: draw(widthMm) }), art: [] },
  ],
  contents: layContents,
  gap: ({ heightMm }) => [{ heightMm, gapBeforeMm: 0, node: null, art: [] }],
}

/** A block as the pieces that may be parted by a page's end. */
export function layBlock(block: Block, widthMm: number, id: string): Piece[] {
  const lay = layers[block.kind] as (block: Block, widthMm: number, id: string) => Piece[]
  return lay(block, widthMm, id)
}

const SIGNATURE_MM = 24

/** Empty lines for a hand: signature at left, date at right. */
function signaturePiece(role: string, name: string, widthMm: number): Piece {
  const style = type.small
  const dateAt = widthMm * 0.68
  const line = (from: number, to: number): Shape =>
    polyline(
      [
        { x: from, y: 15 },
        { x: to, y: 15 },
      ],
      { tone: 'ink', widthMm: 0.35 },
    )
  const texts = [
    ...layLines({ text: role, xMm: 0, widthMm: widthMm * 0.6, style: { ...style, tone: 'mute' } }),
    ...layLines({ text: name, xMm: 0, widthMm: widthMm * 0.6, yMm: 16, style }),
    ...layLines({ text: 'Date', xMm: dateAt, widthMm: widthMm - dateAt, yMm: 16, style }),
  ]
  return {
    heightMm: SIGNATURE_MM,
    gapBeforeMm: gaps.block,
    node: node('P', { texts }),
    art: [line(0, widthMm * 0.6), line(dateAt, widthMm)],
  }
}
