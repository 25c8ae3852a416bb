import { planVersion, upgradePlan } from './upgrade-plan'

/** A plan as the first released version stored it. It stays here for good: whatever comes later must open it. */
const storedByVersion1 = {
  inputVersion: 1,
  ramp: {
    widthFt: 18,
    gradeRunPerRise: 8,
    topAboveFullPoolFt: 1.5,
    toeBelowFullPoolFt: 3,
    drinkingDepthAtLowWaterFt: 1.5,
  },
  funding: { sources: [{ scheduleKey: 'sable-basin-water-fund', rate: 'base' }] },
}

describe('a stored design plan', () => {
  it('of every released version opens in the present one', () => {
    const opened = upgradePlan(storedByVersion1)
    expect(opened.inputVersion).toBe(planVersion)
    expect(opened.ramp?.gradeRunPerRise).toBe(8)
    expect(opened.funding?.sources[0]?.scheduleKey).toBe('sable-basin-water-fund')
  })

  it('is not changed by being opened', () => {
    const before = structuredClone(storedByVersion1)
    upgradePlan(storedByVersion1)
    expect(storedByVersion1).toEqual(before)
  })

  it('of a newer server is refused and not read half', () => {
    expect(() => upgradePlan({ ...storedByVersion1, inputVersion: planVersion + 1 })).toThrow(/input version/)
  })

  it.each([[null], ['plan'], [[]], [{}], [{ inputVersion: '1' }], [{ inputVersion: 0 }]])(
    'that Wadestone never wrote is refused: %j',
    (stored) => {
      expect(() => upgradePlan(stored)).toThrow(/stored design plan/)
    },
  )
})
