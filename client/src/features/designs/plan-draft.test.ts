import type { DesignPlan } from 'shared'
import { describe, expect, it } from 'vitest'
import { savablePlan } from './plan-draft'
import { changedParts, mergePlans } from './same-plan'

const earthwork = { edgeAllowanceFt: 0.5, cutSideRunPerRise: 3, fillSideRunPerRise: 3, stationIntervalFt: 10 }
const ramp = {
  widthFt: 14,
  gradeRunPerRise: 10,
  topAboveFullPoolFt: 2,
  toeBelowFullPoolFt: 2.5,
  drinkingDepthAtLowWaterFt: 1.25,
}
const stored: DesignPlan = { inputVersion: 1, ramp }

describe('what of a draft can be saved', () => {
  it('leaves a half-filled part out, names it, and keeps what is stored of it', () => {
    const draft = { inputVersion: 1, ramp: { ...ramp, widthFt: '1o' }, earthwork: { edgeAllowanceFt: 1 } }
    expect(savablePlan(draft, stored)).toEqual({ plan: stored, unfinished: ['ramp', 'earthwork'] })
  })

  it('takes complete parts and drops emptied fields', () => {
    const draft = { inputVersion: 1, ramp: { ...ramp, apronLengthFt: null }, earthwork }
    expect(savablePlan(draft, stored)).toEqual({ plan: { ...stored, earthwork }, unfinished: [] })
  })

  it('drops a part that was left out', () => {
    expect(savablePlan({ inputVersion: 1, ramp: null }, stored).plan).toEqual({ inputVersion: 1 })
  })

  it('sends no roll of a wire that no run names any more', () => {
    const run = {
      ...{
        name: 'a',
        role: 'lane',
        path: { lengthFt: 100 },
        fence: 'smooth',
        energized: false,
        inWater: false,
      },
      ...{ wires: 3, postSpacingFt: 20, gates: [], wireKind: '12.5 gauge' },
    }
    const fence = {
      ...{
        runs: [run],
        nodes: [],
        cornerAngleDeg: 20,
        maxPullFt: 660,
        wastePercent: 5,
        minimumGroundRods: 3,
      },
      ...{ rollLengthFt: { '12.5 gauge': 4000, old: 1 }, energizerRule: 'fence-mile', groundRodLengthFt: 8 },
    }
    const { plan, unfinished } = savablePlan({ inputVersion: 1, fence }, { inputVersion: 1 })
    expect(unfinished).toEqual([])
    expect(plan.fence?.rollLengthFt).toEqual({ '12.5 gauge': 4000 })
  })
})

describe('two plans', () => {
  it('are the same in whatever order their fields are stored', () => {
    const turned = Object.fromEntries(Object.entries(ramp).reverse()) as typeof ramp
    expect(changedParts({ inputVersion: 1, ramp: turned }, stored)).toEqual([])
  })

  it('merge by part: mine where I changed it, theirs elsewhere', () => {
    const mine: DesignPlan = { ...stored, earthwork }
    const theirs: DesignPlan = { inputVersion: 1, ramp: { ...ramp, widthFt: 20 } }
    expect(mergePlans(mine, stored, theirs)).toEqual({ ...theirs, earthwork })
  })
})
