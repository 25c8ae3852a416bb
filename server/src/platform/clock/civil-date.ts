/** Which day it is in a place: the civil date `YYYY-MM-DD` of an instant in an IANA time zone. */
export function civilDateIn(timeZone: string, instant: Date): string {
  // The Canadian English form of a date is the ISO form.
  const format = new Intl.DateTimeFormat('en-CA', {
    timeZone,
    year: 'numeric',
    month: '2-digit',
    day: '2-digit',
  })
  return format.format(instant)
}
