import type { EventView } from 'shared'

export interface TimelineEntry extends EventView {
  /** Openings of single pages behind one line; empty for any other event. */
  folded: readonly EventView[]
}

const isReading = ({ kind }: EventView): boolean => kind === 'page-read'

/**
 * Makes one line of the pages that a person opened one after the other. Each stays an event of its own with its own
 * fingerprint; the line carries the newest.
 *
 * @param events in either order of sequence
 */
export function foldReadings(events: readonly EventView[]): TimelineEntry[] {
  const entries: TimelineEntry[] = []
  for (const event of events) {
    const before = entries.at(-1)
    if (before && isReading(event) && isReading(before) && before.who === event.who) {
      entries[entries.length - 1] = withOneMore(before, event)
    } else entries.push({ ...event, folded: [] })
  }
  return entries
}

function withOneMore(before: TimelineEntry, event: EventView): TimelineEntry {
  const folded = [...(before.folded.length === 0 ? [before] : before.folded), event]
  return { ...before, sentence: `${event.who ?? 'Somebody'} opened ${folded.length} pages.`, folded }
}
