import { criteriaSetInputSchema, type Criterion } from 'shared'
import { criterionProblems } from './criterion-problems'
import { publishedCriteriaInput } from './published-criteria-input'

const criterion = (change: Partial<Criterion>): Criterion => ({
  id: 'grade',
  practice: '614',
  title: 'Grade of the ramp',
  comparison: 'at-least',
  limit: 6,
  unit: 'run per rise',
  whenMissed: 'fail',
  source: 'state standard',
  confidence: 'read',
  ...change,
})

describe('a criteria set', () => {
  it('of the published criteria is one that a district could have entered itself', () => {
    const published = publishedCriteriaInput()
    expect(criteriaSetInputSchema.safeParse(published).success).toBe(true)
    expect(criterionProblems(published.criteria)).toEqual([])
  })

  it('has every id once', () => {
    expect(criterionProblems([criterion({}), criterion({ title: 'Steepest grade' })])).toEqual([
      {
        pointer: '/criteria/1/id',
        message: 'Two criteria have the id "grade". Give "Steepest grade" another.',
      },
    ])
  })

  it.each([
    ['at-least', [6, 8]],
    ['at-most', [6, 8]],
    ['between', 6],
    ['between', null],
    ['between', [8, 6]],
    ['between', { setting: 'swellPercent' }],
    ['yes', 1],
  ] as [Criterion['comparison'], Criterion['limit']][])('refuses %s against %j', (comparison, limit) => {
    expect(criterionProblems([criterion({ comparison, limit })])[0]?.pointer).toBe('/criteria/0/limit')
  })

  it.each([
    ['at-least', null],
    ['at-most', { setting: 'toePitMaxFt' }],
    ['between', [6, 6]],
    ['yes', null],
  ] as [Criterion['comparison'], Criterion['limit']][])('takes %s against %j', (comparison, limit) => {
    expect(criterionProblems([criterion({ comparison, limit })])).toEqual([])
  })

  it('takes no limit from a setting that there is not', () => {
    const [problem] = criterionProblems([criterion({ limit: { setting: 'toePitFt' } })])
    expect(problem?.message).toContain('"toePitFt"')
  })
})
