import type { EventView } from 'shared'
import { describe, expect, it } from 'vitest'
import { eventsByDay } from './events-by-day'

const event = (sequence: number, at: string): EventView => ({
  sequence,
  at,
  kind: 'note-written',
  who: 'Ines Varga',
  sentence: `Line ${sequence}.`,
  rowHash: 'ab'.repeat(32),
})

describe('the timeline', () => {
  it('puts an event under the day of the district, not of UTC', () => {
    const days = eventsByDay([event(1, '2026-05-15T03:30:00.000Z')], 'America/Chicago')
    expect(days.map(({ day }) => day)).toEqual(['14 May 2026'])
    expect(days[0]?.events[0]?.time).toBe('22:30 CDT')
  })

  it('stands newest first, days and lines alike', () => {
    const days = eventsByDay(
      [event(1, '2026-05-13T15:00:00Z'), event(2, '2026-05-14T15:00:00Z'), event(3, '2026-05-14T16:00:00Z')],
      'America/Chicago',
    )
    expect(days.map(({ events }) => events.map(({ sequence }) => sequence))).toEqual([[3, 2], [1]])
  })
})
