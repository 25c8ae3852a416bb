import { describe, expect, it } from 'vitest'
import { averageAnnualCost } from './average-annual-cost.js'

describe('averageAnnualCost', () => {
  it('is 2.52 a foot and year for a 14.60 access road (NRCS Michigan FOTG section I, December 2010)', () => {
    const road = {
      installedCost: '14.60',
      lifeYears: 10,
      interestRatePercent: 3.9,
      operationAndMaintenancePercent: 5,
    }
    expect(averageAnnualCost(road)).toBe('2.52')
  })

  it('spreads the cost evenly when there is no interest', () => {
    const plain = {
      installedCost: '1000.00',
      lifeYears: 20,
      interestRatePercent: 0,
      operationAndMaintenancePercent: 0,
    }
    expect(averageAnnualCost(plain)).toBe('50.00')
  })

  it('grows with the interest rate', () => {
    const at = (interestRatePercent: number) =>
      Number(
        averageAnnualCost({
          installedCost: '5000.00',
          lifeYears: 10,
          interestRatePercent,
          operationAndMaintenancePercent: 2,
        }),
      )
    expect(at(4)).toBeGreaterThan(at(3.9))
  })

  it('refuses a life of no years', () => {
    const none = {
      installedCost: '1.00',
      lifeYears: 0,
      interestRatePercent: 0,
      operationAndMaintenancePercent: 0,
    }
    expect(() => averageAnnualCost(none)).toThrow('lifeYears')
  })
})
