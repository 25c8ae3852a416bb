import { describe, expect, it } from 'vitest'
import { fundingPlanSchema } from './funding-plan.js'

const choice = (scheduleKey: string, more: object = {}) => ({ scheduleKey, rate: 'base', ...more })
const issuesOf = (sources: unknown[]) =>
  fundingPlanSchema.safeParse({ sources }).error?.issues.map(({ path, message }) => [path, message])

describe('the funds of a plan', () => {
  it('may each be named once', () => {
    expect(issuesOf([choice('creek-fund'), choice('soil-fund')])).toBeUndefined()
  })

  it.each([
    ['as it is', choice('creek-fund')],
    ['at another rate', choice('creek-fund', { rate: 'higher' })],
    ['with another limit', choice('creek-fund', { personLimitRemaining: '10.00' })],
    ['with blanks around it', choice(' creek-fund ')],
  ])('are refused where one is named again %s, with a sentence at the second', (_, again) => {
    expect(issuesOf([choice('creek-fund'), choice('soil-fund'), again])).toEqual([
      [['sources', 2, 'scheduleKey'], 'Fund 1 of this plan is the same; a fund pays once, up to its cap'],
    ])
  })

  it('name their contracted lines in plain text', () => {
    const issues = issuesOf([choice('creek-fund', { contracted: { 'stone\ud800': 3 } })])
    expect(issues?.map(([path]) => path)).toEqual([['sources', 0, 'contracted', 'stone\ud800']])
  })
})
