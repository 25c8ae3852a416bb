const DAY_MS = 86_400_000

/** Whole days from an instant until now, never below 0. */
export const daysWaiting = (since: string, nowMs: number): number =>
  Math.max(0, Math.floor((nowMs - Date.parse(since)) / DAY_MS))
