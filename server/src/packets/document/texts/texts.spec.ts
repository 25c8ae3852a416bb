import { cautions, permitQuestions } from './cautions.js'
import { constructionNotes } from './construction-notes.js'
import { operationAndMaintenance } from './operation-and-maintenance.js'
import { itemsFor, sourceLines } from './text-block.js'

const blocks = [constructionNotes, operationAndMaintenance, permitQuestions]

describe('text blocks', () => {
  it('carry a version, and a source or the word that there is none on every line', () => {
    blocks.forEach(({ version, items }) => {
      expect(version).toMatch(/^\d{4}-\d+$/)
      items.forEach(({ source }) => expect(source.length).toBeGreaterThan(4))
    })
  })

  it('ask, and never say that a rule does not apply', () => {
    const words = [...blocks.flatMap(({ items }) => items.map(({ text }) => text)), ...cautions].join(' ')
    expect(words).not.toMatch(/exempt|no permit is needed|not required/i)
  })

  it('speak of the dam at a pond only and of the streambed at a stream only', () => {
    const pond = itemsFor(permitQuestions, 'pond')
      .map(({ text }) => text)
      .join(' ')
    const stream = itemsFor(permitQuestions, 'stream')
      .map(({ text }) => text)
      .join(' ')
    expect(pond).toContain('dam-safety')
    expect(pond).not.toContain('Streambed')
    expect(stream).toContain('Streambed')
    expect(stream).not.toContain('dam-safety')
  })

  it('list sources by the numbers of the lines that are printed', () => {
    const items = [
      { text: 'a', source: 'One' },
      { text: 'b', source: 'Two' },
      { text: 'c', source: 'One' },
    ]
    expect(sourceLines(items)).toEqual(['One: 1, 3.', 'Two: 2.'])
  })
})
