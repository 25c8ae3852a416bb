import type { Ask } from '../ask.js'
import type { WorkingFigure } from '../working-figure.js'

type Numbers = readonly (readonly [name: string, value: number | undefined, unit: string])[]

/** One figure, written short. A number that is not known is left out. */
export function figure(shown: Omit<WorkingFigure, 'numbers'>, numbers: Numbers): WorkingFigure {
  return {
    ...shown,
    numbers: numbers.flatMap(([name, value, unit]) => (value === undefined ? [] : [{ name, value, unit }])),
  }
}

/** The working of one part; nothing while the part is not ready. */
export type PartWorking = (ask: Ask) => WorkingFigure[]
