import { textWidthMm, type TextShape } from 'shared'
import PDFDocument from 'pdfkit'
import { buildPacketView } from '../build-packet-view.js'
import type { PageNode } from '../packet-document.js'
import { fonts } from '../render/fonts.js'
import { northPondSource } from '../../../../test/packets/north-pond-source.js'
import { textPage } from '../theme.js'
import type { Block } from './block.js'
import { paginate } from './paginate.js'

const textsOf = (node: PageNode): TextShape[] => [...node.texts, ...node.children.flatMap(textsOf)]
const startShare = { left: 0, center: 0.5, right: 1 } as const
const edges = (text: TextShape) => {
  const width = textWidthMm(text)
  const left = text.at.x - startShare[text.align] * width
  return { left, right: left + width }
}

const longWord = 'Unbrokenwordthatislongerthananycolumnofthistable'
const table: Block = {
  kind: 'table',
  columns: [
    { title: 'Item', share: 30 },
    { title: 'Quantity', share: 20, align: 'right' },
    { title: longWord, share: 20 },
  ],
  rows: Array.from({ length: 120 }, (_, index) => ({
    cells: [`Row ${index} ${longWord}`, String(index), 'source '.repeat(12)],
  })),
}

describe('text widths', () => {
  it('are those of the font that is embedded, as pdfkit itself measures it, kerning aside', () => {
    const doc = new PDFDocument({ font: fonts.regular, margin: 0 })
    const words = [
      'Call the utility-locating service.',
      '18′-0″ × 23′-0″',
      '≥ 6 : 1 (12.5 %)',
      '$6,564.45',
      '√(run² + rise²)',
      'ñandú',
    ]
    words.forEach((text) => {
      const measured = doc.font(fonts.regular).fontSize(100).widthOfString(text)
      const ours = textWidthMm({ text, sizeMm: 100, weight: 'regular' })
      expect(Math.abs(ours - measured) / measured).toBeLessThan(0.03)
    })
  })
})

describe('paginate', () => {
  const pages = paginate({ title: 'Long', blocks: [{ kind: 'heading', text: 'A table' }, table] })

  it('sets no text outside the page’s margins', () => {
    pages
      .flatMap(({ nodes }) => nodes.flatMap(textsOf))
      .forEach((text) => {
        expect(edges(text).left).toBeGreaterThanOrEqual(textPage.leftMm - 0.01)
        expect(edges(text).right).toBeLessThanOrEqual(textPage.widthMm - textPage.rightMm + 0.01)
        expect(text.at.y).toBeLessThanOrEqual(textPage.heightMm - textPage.bottomMm)
      })
  })

  it('loses no row and repeats the head on each page', () => {
    const all = pages.flatMap(({ nodes }) => nodes.flatMap(textsOf)).map(({ text }) => text)
    for (let row = 0; row < 120; row += 1)
      expect(all.some((text) => text.startsWith(`Row ${row}`))).toBe(true)
    pages.forEach(({ nodes }) =>
      expect(nodes.flatMap(textsOf).some(({ text }) => text === 'Quantity')).toBe(true),
    )
    expect(pages.length).toBeGreaterThan(3)
    expect(pages[1]?.title).toBe('Long, continued')
  })

  it('leaves no heading alone at the foot of a page', () => {
    const filler = Array.from({ length: 60 }, (): Block => ({ kind: 'paragraph', text: 'One line of text.' }))
    for (let fill = 20; fill < 40; fill += 1) {
      const draft = {
        title: 'T',
        blocks: [...filler.slice(0, fill), { kind: 'heading' as const, text: 'Head' }, ...filler.slice(0, 2)],
      }
      paginate(draft).forEach(({ nodes }) => expect(nodes.at(-1)?.tag).not.toBe('H2'))
    }
  })
})

describe('the north pond’s packet', () => {
  it('never lets two lines of a text page overlap', () => {
    buildPacketView(northPondSource())
      .pages.filter(({ widthMm, heightMm }) => heightMm > widthMm)
      .forEach(({ nodes }) => {
        const lines = nodes.flatMap(textsOf).map((text) => ({
          ...edges(text),
          bottom: text.at.y,
          top: text.at.y - text.sizeMm * 0.66,
          text: text.text,
        }))
        const clashes = lines.flatMap((one, index) =>
          lines
            .slice(index + 1)
            .filter(
              (two) =>
                one.left < two.right && two.left < one.right && one.top < two.bottom && two.top < one.bottom,
            )
            .map((two) => [one.text, two.text]),
        )
        expect(clashes).toEqual([])
      })
  })
})
