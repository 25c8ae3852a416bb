const months = 'January February March April May June July August September October November December'.split(
  ' ',
)

/** A civil date in words: civilDateText("2026-05-14") is "14 May 2026". It never passes through a clock. */
export function civilDateText(date: string): string {
  const [year, month, day] = date.slice(0, 10).split('-')
  return `${Number(day)} ${months[Number(month) - 1] ?? month} ${year}`
}
