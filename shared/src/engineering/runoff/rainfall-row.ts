import { refuseText } from './refuse-text.js'

export interface RainfallRow {
  label: string
  durationHr: number
  depths: number[]
}

const MINUTES_PER = { min: 1, hr: 60, day: 1440 } as const

const unitOf = (word: string | undefined) =>
  word === 'min' || word === 'hr' || word === 'day' ? MINUTES_PER[word] : undefined

/**
 * One row of the table, such as `24-hr:, 4.01,4.76,6.09`.
 *
 * @returns label, duration in hours and the depths, or undefined when the cells are no such row.
 * @throws EngineeringInputError naming text for a depth that is missing, not a number, or less than the one before it.
 * @example rainfallRow(['24-hr:', ' 4.01', '4.76'], 2) // { label: '24-hr', durationHr: 24, depths: [4.01, 4.76] }
 */
export function rainfallRow(cells: readonly string[], columns: number): RainfallRow | undefined {
  const label = cells[0]?.trim() ?? ''
  const match = /^(\d+)-(min|hr|day):?$/.exec(label)
  const minutesPerUnit = unitOf(match?.[2])
  if (!match || !minutesPerUnit) return undefined
  const name = label.replace(/:$/, '')
  const depths = cells.slice(1, columns + 1).map((cell) => (cell.trim() === '' ? NaN : Number(cell)))
  if (depths.length < columns || depths.some((depth) => !(depth > 0 && Number.isFinite(depth)))) {
    refuseText(`Row ${name} must hold ${columns} rainfall depths greater than 0.`)
  }
  if (depths.some((depth, index) => depth < (depths[index - 1] ?? 0))) {
    refuseText(`Row ${name} falls from one return period to the next; depths must not get less.`)
  }
  return { label: name, durationHr: (Number(match[1]) * minutesPerUnit) / 60, depths }
}
