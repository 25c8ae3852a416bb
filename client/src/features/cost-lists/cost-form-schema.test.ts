import { describe, expect, it } from 'vitest'
import { quantityKeys, type CostListView } from 'shared'
import { ProblemError } from '../../api/problem-error'
import { costFormSchema, rowsFrom } from './cost-form-schema'
import { movedProblem } from './moved-problem'

const line = { key: 'gate', low: '180.00', typical: '230.00', high: '290.00' }
const inForce = { lines: [line] } as unknown as CostListView
const gatePlace = quantityKeys.findIndex((key) => key === 'gate')
const typed = (lines = rowsFrom(inForce)) => ({
  name: 'Unit costs 2026',
  effectiveFrom: '2026-01-01',
  source: 'Bids of 2025',
  lines,
})

describe('a new list of unit costs', () => {
  it('begins with every quantity and the prices of the list in force', () => {
    expect(rowsFrom(inForce)).toHaveLength(quantityKeys.length)
    expect(rowsFrom(inForce)[gatePlace]).toEqual(line)
  })

  it('leaves out what has no price', () => {
    expect(costFormSchema.parse(typed()).lines).toEqual([line])
  })

  it('names the missing price of a row that is priced in part, at its own place', () => {
    const lines = rowsFrom(inForce).map((row) => (row.key === 'gate' ? { ...row, high: undefined } : row))
    expect(costFormSchema.safeParse(typed(lines)).error?.issues).toMatchObject([
      { path: ['lines', gatePlace, 'high'] },
    ])
  })

  it('puts what the server says of a line that was sent at the row of the form', () => {
    const problem = new ProblemError({
      slug: 'invalid-fields',
      status: 422,
      title: 'Some fields need another look',
      fields: [{ pointer: '/lines/0/typical', message: 'Below the low one.' }],
    })
    const moved = movedProblem(problem, [line]) as ProblemError
    expect(moved.fields).toEqual([{ pointer: `/lines/${gatePlace}/typical`, message: 'Below the low one.' }])
  })
})
