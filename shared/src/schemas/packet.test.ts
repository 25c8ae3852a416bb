import { describe, expect, it } from 'vitest'
import { actSchema } from './packet.js'

const pathsOf = (act: object) => actSchema.safeParse(act).error?.issues.map(({ path }) => path)

describe('what comes with an act', () => {
  const approve = { action: 'approve', packetSha256: 'a'.repeat(64) }
  const ask = { action: 'ask-for-changes', note: 'Move the gate.' }

  it.each(['0001-01-01', '9999-12-31'])('names no meeting on %s', (meetingDate) => {
    expect(pathsOf({ ...approve, meetingDate })).toEqual([['meetingDate']])
    expect(pathsOf({ ...approve, meetingDate: '2026-05-14' })).toBeUndefined()
  })

  it('names no page beyond those that a packet can have', () => {
    expect(pathsOf({ ...ask, page: 201 })).toEqual([['page']])
    expect(pathsOf({ ...ask, page: 200 })).toBeUndefined()
  })
})
