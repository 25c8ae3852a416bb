import type { CostLine } from 'shared'
import { northPond } from '../../../shared/examples/north-pond-design'
import { costLineProblems } from './cost-line-problems'

const line = (change: Partial<CostLine> = {}): CostLine => ({
  key: 'gate',
  low: '220.50',
  typical: '245.00',
  high: '281.75',
  ...change,
})

describe('a cost list', () => {
  it('like that of the north pond is taken', () => {
    expect(costLineProblems(northPond.costList.lines)).toEqual([])
  })

  it('prices only what a design counts, and says what that is', () => {
    const [problem, ...others] = costLineProblems([line({ key: 'gates' }), line()])
    expect(problem?.pointer).toBe('/lines/0/key')
    expect(problem?.message).toMatch(/"gates".*stone-surface.*gate/)
    expect(others).toEqual([])
  })

  it('prices nothing twice', () => {
    expect(costLineProblems([line(), line()]).map(({ pointer }) => pointer)).toEqual(['/lines/1/key'])
  })

  it('goes from low over typical to high, by value and not by text', () => {
    expect(costLineProblems([line({ low: '9.00', typical: '10.0', high: '10' })])).toEqual([])
    expect(costLineProblems([line({ typical: '220.4999' })]).map(({ pointer }) => pointer)).toEqual([
      '/lines/0/typical',
    ])
    expect(costLineProblems([line({ high: '99.00' })])[0]?.message).toContain(
      'The high price of gate, 99.00, is below its typical one, 245.00.',
    )
  })
})
