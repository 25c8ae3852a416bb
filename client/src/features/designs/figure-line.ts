import { numberText } from 'shared'

/** One figure that follows from the plan, ready to be shown. */
export interface FigureLine {
  label: string
  value: string
  unit?: string
  isSum?: boolean
}

export const line = (label: string, value: number, unit?: string, places = 2): FigureLine => ({
  label,
  value: numberText(value, places),
  unit,
})

export const said = (label: string, value: string): FigureLine => ({ label, value })

/** A figure that some designs do not have. */
export const lineIfAny = (label: string, value: number | null | undefined, unit?: string, places = 2) =>
  value === undefined || value === null ? [] : [line(label, value, unit, places)]
