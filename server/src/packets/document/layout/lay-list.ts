import { polygon, textAt, type Shape } from 'shared'
import { gaps, type } from '../theme.js'
import type { Block } from './block.js'
import { layLines, linesHeight } from './lay-lines.js'
import { node, type Piece } from './piece.js'

type List = Extract<Block, { kind: 'list' }>

const INDENT_MM = 7

/** Items with a dash, a number, or a box to tick by hand. */
export function layList({ items, marker = 'dash' }: List, widthMm: number, id: string): Piece[] {
  const style = type.text
  return items.map((text, index): Piece => {
    const texts = layLines({ text, xMm: INDENT_MM, widthMm: widthMm - INDENT_MM, style })
    const first = texts[0]?.at.y ?? 0
    const sign = { dash: '–', number: `${index + 1}.`, box: '' }[marker]
    const label = sign ? [textAt(sign, { x: 0, y: first }, { sizeMm: style.sizeMm, tone: 'mute' })] : []
    return {
      heightMm: linesHeight(texts, style),
      gapBeforeMm: index === 0 ? gaps.block : gaps.item,
      node: node('LI', { children: [node('Lbl', { texts: label }), node('LBody', { texts })] }),
      art: marker === 'box' ? [box(first)] : [],
      group: { id, tag: 'L' },
    }
  })
}

const box = (baselineMm: number): Shape =>
  polygon(
    [
      { x: 0.3, y: baselineMm - 3 },
      { x: 3.5, y: baselineMm - 3 },
      { x: 3.5, y: baselineMm + 0.2 },
      { x: 0.3, y: baselineMm + 0.2 },
    ],
    { stroke: { tone: 'ink', widthMm: 0.3 } },
  )
