import { describe, expect, it } from 'vitest'
import { curveNumberTable } from './curve-number-table.js'

const GROUPS = ['A', 'B', 'C', 'D'] as const
const ORDER = ['poor', 'fair', 'good']

describe('curveNumberTable', () => {
  it.each(curveNumberTable.rows)(
    'rises from soil group A to D in row $cover $condition',
    ({ curveNumbers }) => {
      const values = GROUPS.map((group) => curveNumbers[group])
      expect(values).toEqual([...values].sort((a, b) => a - b))
      expect(Math.min(...values)).toBeGreaterThanOrEqual(30)
      expect(Math.max(...values)).toBeLessThanOrEqual(98)
    },
  )

  it('falls as the condition of a cover gets better', () => {
    for (const row of curveNumberTable.rows) {
      const better = curveNumberTable.rows.filter(
        (other) =>
          other.cover === row.cover &&
          ORDER.indexOf(other.condition ?? '') > ORDER.indexOf(row.condition ?? ''),
      )
      for (const other of better) {
        for (const group of GROUPS) expect(other.curveNumbers[group]).toBeLessThan(row.curveNumbers[group])
      }
    }
  })

  it('holds the printed pasture rows (USDA NRCS TR-55, 1986, table 2-2)', () => {
    const pasture = curveNumberTable.rows.filter(({ cover }) => cover.startsWith('Pasture'))
    expect(pasture.map(({ condition, curveNumbers }) => [condition, ...Object.values(curveNumbers)])).toEqual(
      [
        ['poor', 68, 79, 86, 89],
        ['fair', 49, 69, 79, 84],
        ['good', 39, 61, 74, 80],
      ],
    )
  })
})
