import { civilDateText } from './civil-date-text.js'

const parts = {
  year: 'numeric',
  month: '2-digit',
  day: '2-digit',
  hour: '2-digit',
  minute: '2-digit',
  hourCycle: 'h23',
  timeZoneName: 'short',
} as const

/**
 * A moment in a district's own zone, with the zone beside it: formatInstant('2026-05-14T20:04:00Z', 'America/Chicago')
 * is "14 May 2026, 15:04 CDT".
 */
export function formatInstant(instant: string, zone: string): string {
  const format = new Intl.DateTimeFormat('en-US', { ...parts, timeZone: zone })
  const found = Object.fromEntries(
    format.formatToParts(new Date(instant)).map(({ type, value }) => [type, value]),
  )
  const date = civilDateText(`${found.year}-${found.month}-${found.day}`)
  return `${date}, ${found.hour}:${found.minute} ${found.timeZoneName}`
}
