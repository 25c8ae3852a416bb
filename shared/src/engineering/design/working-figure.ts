import type { DesignPartName } from './design-parts.js'

/** How one figure was found, so that a reader can follow it with a pencil. Numbers are not rounded here. */
export interface WorkingFigure {
  key: string
  part: DesignPartName
  label: string
  formula: string
  numbers: { name: string; value: number; unit: string }[]
  result: number
  unit: string
  source: string
}
