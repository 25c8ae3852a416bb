import { polyline } from 'shared'
import { gaps, type } from '../theme.js'
import type { Block } from './block.js'
import { layLines, linesHeight } from './lay-lines.js'
import { node, type Piece } from './piece.js'

type Facts = Extract<Block, { kind: 'facts' }>

const NAME_SHARE = 0.3
const ROW_MM = 0.7

/** Name and value, line by line. */
export function layFacts({ facts }: Facts, widthMm: number, id: string): Piece[] {
  const nameWidth = widthMm * NAME_SHARE
  return facts.map(({ name, value }, index): Piece => {
    const names = layLines({
      text: name,
      xMm: 0,
      widthMm: nameWidth - 3,
      yMm: ROW_MM,
      style: { ...type.text, tone: 'mute' },
    })
    const values = layLines({
      text: value,
      xMm: nameWidth,
      widthMm: widthMm - nameWidth,
      yMm: ROW_MM,
      style: type.text,
    })
    const heightMm = Math.max(linesHeight(names, type.text), linesHeight(values, type.text)) + ROW_MM * 2
    return {
      heightMm,
      gapBeforeMm: index === 0 ? gaps.block : 0,
      node: node('TR', {
        children: [node('TH', { texts: names, scope: 'Row' }), node('TD', { texts: values })],
      }),
      art: [
        polyline(
          [
            { x: 0, y: heightMm },
            { x: widthMm, y: heightMm },
          ],
          { tone: 'hairline', widthMm: 0.25 },
        ),
      ],
      group: { id, tag: 'Table' },
    }
  })
}
