import { First1780000000000 } from './1780000000000-first.js'

/** In the order they run. */
export const migrations = [First1780000000000] as const
