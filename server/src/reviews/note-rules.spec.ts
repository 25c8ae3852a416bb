import type { Role } from 'shared'
import { refuseAnswer, refuseSettling } from './note-rules.js'

const note = (status: 'open' | 'answered' | 'settled') => ({ status, authorId: 'author' })
const person = (personId: string, ...roles: Role[]) => ({ personId, roles })

describe('a note', () => {
  it('is settled by its author at any time', () => {
    expect(() => refuseSettling(note('open'), person('author', 'landowner'))).not.toThrow()
    expect(() => refuseSettling(note('answered'), person('author', 'supervisor'))).not.toThrow()
  })

  it('of somebody else is settled by a planner only once it is answered', () => {
    const planner = person('planner', 'planner')
    expect(() => refuseSettling(note('open'), planner)).toThrow(
      expect.objectContaining({ slug: 'transition-not-allowed' }),
    )
    expect(() => refuseSettling(note('answered'), planner)).not.toThrow()
  })

  it('of somebody else is never settled by a landowner or supervisor', () => {
    for (const role of ['landowner', 'supervisor'] as const) {
      expect(() => refuseSettling(note('answered'), person('other', role))).toThrow(
        expect.objectContaining({ slug: 'forbidden' }),
      )
    }
  })

  it('that is settled takes neither an answer nor a second settling', () => {
    expect(() => refuseAnswer(note('settled'))).toThrow(
      expect.objectContaining({ slug: 'transition-not-allowed' }),
    )
    expect(() => refuseSettling(note('settled'), person('author', 'planner'))).toThrow(
      expect.objectContaining({ slug: 'transition-not-allowed' }),
    )
  })
})
