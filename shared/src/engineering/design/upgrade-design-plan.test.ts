import { describe, expect, it } from 'vitest'
import versionOne from '../../../test/plan-version-1.json' with { type: 'json' }
import { upgradeDesignPlan } from './upgrade-design-plan.js'

describe('upgradeDesignPlan', () => {
  it('opens a plan that version 1 wrote, with nothing changed', () => {
    expect(upgradeDesignPlan(structuredClone(versionOne))).toEqual(versionOne)
  })

  it.each([
    ['a version that is not released', { ...versionOne, inputVersion: 2 }],
    ['a plan without a version', { ramp: versionOne.ramp }],
    ['a field that no version had', { ...versionOne, moat: {} }],
    ['nothing', null],
  ])('refuses %s', (_, stored) => {
    expect(() => upgradeDesignPlan(stored)).toThrow()
  })
})
