import type { EventView } from 'shared'
import { describe, expect, it } from 'vitest'
import { foldReadings } from './fold-readings'

const event = (sequence: number, kind: string, who = 'Signe Quist'): EventView => ({
  sequence,
  kind,
  who,
  at: '2026-05-14T15:00:00Z',
  sentence: `Line ${sequence}.`,
  rowHash: String(sequence).repeat(64).slice(0, 64),
})

describe('pages opened one after the other', () => {
  it('stand as one line that counts them, and keep every event', () => {
    const [entry, ...rest] = foldReadings([
      event(3, 'page-read'),
      event(2, 'page-read'),
      event(1, 'page-read'),
    ])
    expect(entry?.sentence).toBe('Signe Quist opened 3 pages.')
    expect(entry?.folded.map(({ sentence }) => sentence)).toEqual(['Line 3.', 'Line 2.', 'Line 1.'])
    expect(rest).toEqual([])
  })

  it('are not counted across another act or another person', () => {
    const events = [
      event(4, 'page-read'),
      event(3, 'sign'),
      event(2, 'page-read'),
      event(1, 'page-read', 'Ida'),
    ]
    expect(foldReadings(events).map(({ sentence }) => sentence)).toEqual([
      'Line 4.',
      'Line 3.',
      'Line 2.',
      'Line 1.',
    ])
  })
})
