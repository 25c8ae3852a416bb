import { formatInstant, type EventView } from 'shared'
import { foldReadings, type TimelineEntry } from './fold-readings'

export interface TimedEvent extends TimelineEntry {
  /** Of the district's own clock, with its zone. */
  time: string
}

export interface EventDay {
  day: string
  events: TimedEvent[]
}

/** Newest first, under the day it was in the district's zone: an event at night may fall on another day than in UTC. */
export function eventsByDay(events: readonly EventView[], zone: string): EventDay[] {
  const days: EventDay[] = []
  for (const event of foldReadings([...events].sort((a, b) => b.sequence - a.sequence))) {
    const [day = '', time = ''] = formatInstant(event.at, zone).split(', ')
    const open = days.at(-1)
    if (open?.day === day) open.events.push({ ...event, time })
    else days.push({ day, events: [{ ...event, time }] })
  }
  return days
}
