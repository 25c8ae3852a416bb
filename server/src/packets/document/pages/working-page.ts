import { partWords, trimmedNumber, type WorkingFigure } from 'shared'
import type { Block, PageDraft, TableRow } from '../layout/block.js'
import type { PacketSource } from '../packet-source.js'

/** How every figure was found: formula, the numbers put in, result, source. */
export function workingPage({ result }: PacketSource): PageDraft {
  const parts = [...new Set(result.working.map(({ part }) => part))]
  const rows = parts.flatMap((part): TableRow[] => [
    { kind: 'part', cells: [partWords[part]] },
    ...result.working.filter((figure) => figure.part === part).map(figureRow),
  ])
  const blocks: Block[] = [
    {
      kind: 'paragraph',
      text: 'Each figure with its formula and the numbers put in, so that anyone can follow it with a pencil. Numbers are shown to four places; nothing but money was rounded on the way.',
    },
    {
      kind: 'table',
      columns: [
        { title: 'Figure', share: 20 },
        { title: 'Formula and numbers', share: 41 },
        { title: 'Result', share: 14, align: 'right' },
        { title: 'Source', share: 26 },
      ],
      rows,
    },
  ]
  return { title: 'Appendix: working', blocks }
}

function figureRow({ label, formula, numbers, result, unit, source }: WorkingFigure): TableRow {
  const put = numbers.map(
    ({ name, value, unit: own }) => `${name} = ${trimmedNumber(value, 4)}${own ? ` ${own}` : ''}`,
  )
  return {
    cells: [
      label,
      [formula, put.join('; ')].filter(Boolean).join('\n'),
      `${trimmedNumber(result, 4)} ${unit}`.trim(),
      source,
    ],
  }
}
