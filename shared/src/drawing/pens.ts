import type { Stroke, Tone } from './shapes.js'

/** Letter paper on its side, in millimetres. */
export const paper = { widthMm: 279.4, heightMm: 215.9, marginMm: 8 } as const

/** Capitals are 0.66 of the size: 3.8 mm type has capitals of 2.5 mm, the least that survives a copier. */
export const typeMm = { title: 5.2, view: 4.6, text: 3.8, small: 3.1 } as const

/** Line classes, each at least twice the next thinner. */
export const lineMm = { fine: 0.25, medium: 0.5, heavy: 1 } as const

const pen = (tone: Tone, widthMm: number, dashMm?: readonly number[]): Stroke =>
  dashMm ? { tone, widthMm, dashMm } : { tone, widthMm }

export const pens = {
  grid: pen('hairline', lineMm.fine),
  fine: pen('ink', lineMm.fine),
  existing: pen('ink', lineMm.medium, [3, 1.8]),
  finished: pen('ink', lineMm.heavy),
  border: pen('ink', lineMm.heavy),
  outline: pen('ink', lineMm.medium),
  fabric: pen('ink', 0.7, [2.2, 1.1]),
  fullPool: pen('water', lineMm.medium),
  lowWater: pen('water', lineMm.medium, [5, 1.5, 0.8, 1.5]),
  waterToday: pen('water', lineMm.fine, [1.5, 1]),
  waterHatch: pen('water', lineMm.fine),
  soilHatch: pen('soil', lineMm.fine),
  stoneEdge: pen('stoneDark', 0.15),
  fence: pen('grass', lineMm.medium),
  panel: pen('mute', lineMm.fine),
  closing: pen('ink', lineMm.medium, [1.6, 0.8]),
} as const
