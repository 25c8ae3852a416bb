import { textAt } from 'shared'
import { gaps, type } from '../theme.js'
import type { Block } from './block.js'
import { node, type Piece } from './piece.js'

type Contents = Extract<Block, { kind: 'contents' }>

const COLUMNS = 2
const NUMBER_MM = 8

/** The pages by number, in two columns read downward. */
export function layContents({ pages }: Contents, widthMm: number): Piece[] {
  const rows = Math.ceil(pages.length / COLUMNS)
  const { sizeMm, lineMm } = type.text
  const items = pages.map(({ number, title }, index) => {
    const xMm = (Math.floor(index / rows) * widthMm) / COLUMNS
    const y = (index % rows) * lineMm + lineMm * 0.74
    const label = textAt(
      String(number),
      { x: xMm + NUMBER_MM - 2.5, y },
      { sizeMm, tone: 'mute', align: 'right' },
    )
    const text = textAt(title, { x: xMm + NUMBER_MM, y }, { sizeMm })
    return node('LI', { children: [node('Lbl', { texts: [label] }), node('LBody', { texts: [text] })] })
  })
  return [{ heightMm: rows * lineMm, gapBeforeMm: gaps.block, node: node('L', { children: items }), art: [] }]
}
