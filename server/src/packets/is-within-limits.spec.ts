import type { ApprovalLimits, DesignPlan, DesignResult, Money } from 'shared'
import { isWithinLimits } from './is-within-limits.js'

const limits: ApprovalLimits = {
  maximumHead: 100,
  maximumDrainageAcres: 40,
  maximumFillHeightFt: 3,
  maximumCost: '12000.00' as Money,
}

/** Only the figures that limits are held against; the rest of a design does not matter here. */
interface Figures {
  head: number
  acres: number
  bermFt: number
  fillFt: number
  cost: string
}

function design({ head, acres, bermFt, fillFt, cost }: Figures) {
  const plan = { herd: { headCount: head }, runoff: { areaAcres: acres }, berm: {} }
  const result = {
    earthwork: { ok: true, value: { sections: [{ groundFt: 100, formationFt: 100 + fillFt }] } },
    berm: { ok: true, value: { builtHeightFt: bermFt } },
    cost: { ok: true, value: { typical: cost } },
  }
  return { plan: plan as unknown as DesignPlan, result: result as unknown as DesignResult }
}

const atTheLimits: Figures = { head: 100, acres: 40, bermFt: 3, fillFt: 3, cost: '12000.00' }

describe('the limits of a checker', () => {
  it('cover a design that just reaches each of them', () => {
    expect(isWithinLimits(limits, design(atTheLimits))).toBe(true)
  })

  const beyond: [string, Partial<Figures>][] = [
    ['head', { head: 101 }],
    ['drainage area', { acres: 40.1 }],
    ['height of the berm', { bermFt: 3.01 }],
    ['height of the fill under the ramp', { fillFt: 3.01 }],
    ['cost by one cent', { cost: '12000.01' }],
  ]
  for (const [what, change] of beyond) {
    it(`do not cover a design beyond the limit of ${what}`, () => {
      expect(isWithinLimits(limits, design({ ...atTheLimits, ...change }))).toBe(false)
    })
  }

  it('that were never set cover nothing', () => {
    expect(isWithinLimits(null, design(atTheLimits))).toBe(false)
  })

  it('cover no design whose cost or earthwork is not worked out', () => {
    const whole = design(atTheLimits)
    const failed = { ok: false as const, field: 'rock', message: 'missing' }
    for (const part of ['cost', 'earthwork', 'berm'] as const) {
      const result = { ...whole.result, [part]: failed }
      expect(isWithinLimits(limits, { ...whole, result })).toBe(false)
    }
  })
})
