export interface JobNumberParts {
  prefix: string
  /** The civil date in the district's own zone, so that a job of New Year's Eve keeps the old year. */
  onDate: string
  sequence: number
}

/** The district's number of a job: its letters, the year and a count that never starts again, such as TF-2026-041. */
export function jobNumber({ prefix, onDate, sequence }: JobNumberParts): string {
  const year = onDate.slice(0, 4)
  return [prefix, year, String(sequence).padStart(3, '0')].filter((part) => part !== '').join('-')
}
