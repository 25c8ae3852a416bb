import { jobActions } from 'shared'
import { eventSentence, eventSentences, landownerSees } from './event-sentences'

const words = { who: 'Ines Varga', design: 'First design', facts: { revision: 2, notes: 1, page: 4 } }

describe('the timeline', () => {
  it('has a whole sentence for every act of the workflow', () => {
    for (const action of jobActions) expect(eventSentences[action]?.(words)).toMatch(/^Ines Varga .+\.$/)
  })

  it('ends every sentence with a full stop and leaves no gap for a missing fact', () => {
    for (const kind of Object.keys(eventSentences)) {
      const sentence = eventSentence(kind, words)
      expect(sentence).toMatch(/^[A-Z].*\.$/)
      expect(sentence).not.toMatch(/undefined|null| {2}/)
    }
  })

  it('shows a kind that a newer server wrote instead of hiding it', () => {
    expect(eventSentence('moved-to-archive', words)).toBe('Ines Varga did this: moved to archive.')
  })

  it("keeps the district's own work from a landowner", () => {
    for (const kind of [
      'design-saved',
      'technically-checked',
      'note-written',
      'mail-failed',
      'of-tomorrow',
    ]) {
      expect(landownerSees(kind)).toBe(false)
    }
    expect(landownerSees('sign')).toBe(true)
  })
})
