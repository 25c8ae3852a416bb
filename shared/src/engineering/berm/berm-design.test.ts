import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { BermDesignInput } from './berm-design-types.js'
import { bermDesign } from './berm-design.js'

const refusal = (field: string) => expect.objectContaining({ name: 'EngineeringInputError', field })

const job: BermDesignInput = {
  flowCfs: 7.002002987745496,
  channelGradeFtPerFt: 0.008,
  groundFallFtPerFt: 1 / 30,
  upslopeRunPerRise: 4,
  downslopeRunPerRise: 4,
  topWidthFt: 4,
  resistanceHigh: { roughness: 0.1 },
  resistanceLow: { roughness: 0.04 },
  freeboardFt: 0.3,
  minimumHeightFt: 1,
  settlementPercent: 10,
  rampWidthFt: 18,
  rampEdgeCutFt: 0,
  pastEdgeFt: { left: 45, right: 15 },
  falls: 'left',
  outlets: [{ side: 'left', surface: 'grass', distanceToRampFt: 45, stable: true }],
  shrinkPercent: 10,
}

describe('bermDesign', () => {
  it('gives every figure of the constructed example, no outside evidence', () => {
    const berm = bermDesign(job)
    const expected = {
      depthFt: 0.7671962966174879,
      capacityVelocityFtPerS: 0.6997781451355805,
      lowResistanceDepthFt: 0.5441003365107042,
      velocityFtPerS: 1.39128268864307,
      froude: 0.47026033964980096,
      crestAboveChannelFt: 1.067196296617488,
      settledHeightFt: 1.276155802833153,
      builtHeightFt: 1.4037713831164684,
      areaFt2: 13.759777969483585,
      earthYd3PerFt: 0.5096214062771698,
      lengthFt: 78,
      earthCompactedYd3: 39.750469689619244,
      earthBankYd3: 44.16718854402138,
      channelFallFt: 0.624,
      footprintFt2: 1209.4547610386976,
      downslopeFootFromCentreFt: 8.78663715284524,
    }
    for (const [name, value] of Object.entries(expected)) {
      expect(berm, name).toHaveProperty(name, expect.closeTo(value, 7))
    }
    expect(berm.heightGovernedBy).toBe('depth and freeboard')
    expect(berm.ends).toMatchObject([
      { side: 'left', isOutlet: true, armLengthFt: 78, outlet: { surface: 'grass' } },
      { side: 'right', isOutlet: false, armLengthFt: 0, armFlowCfs: 0 },
    ])
  })

  it('takes 27.7 ft² and reaches 17.7 ft down at an 8:1 cattle crossing (constructed example, no outside evidence)', () => {
    const plain = bermDesign(job)
    const crossed = bermDesign({ ...job, crossing: { lengthFt: 20 } })
    expect(crossed.crossing?.areaFt2).toBeCloseTo(27.7, 1)
    expect(crossed.crossing?.downslopeReachFt).toBeCloseTo(17.7, 1)
    const more = ((crossed.crossing?.areaFt2 ?? 0) - plain.areaFt2) * (20 / 27)
    expect(crossed.earthCompactedYd3 - plain.earthCompactedYd3).toBeCloseTo(more, 9)
    expect(crossed.downslopeFootFromCentreFt).toBeGreaterThan(plain.downslopeFootFromCentreFt)
  })

  it('stands at the least height when there is no flow, also on level ground', () => {
    const berm = bermDesign({ ...job, flowCfs: 0, groundFallFtPerFt: 0 })
    expect(berm).toMatchObject({ depthFt: 0, velocityFtPerS: 0, crestAboveChannelFt: 1 })
    expect(berm.heightGovernedBy).toBe('minimum height')
    expect(berm).not.toHaveProperty('channel')
  })

  it('refuses level ground with flow unless a channel is cut', () => {
    expect(() => bermDesign({ ...job, groundFallFtPerFt: 0 })).toThrow(refusal('groundFallFtPerFt'))
    const cutChannel = {
      shape: 'trapezoid',
      bottomWidthFt: 4,
      leftRunPerRise: 4,
      rightRunPerRise: 4,
      cutDepthFt: 0.5,
    } as const
    expect(bermDesign({ ...job, groundFallFtPerFt: 0, cutChannel }).depthFt).toBeGreaterThan(0)
  })

  it('takes the earth of a cut channel off the earth to bring, and its depth off the ridge', () => {
    const cutChannel = {
      shape: 'trapezoid',
      bottomWidthFt: 3,
      leftRunPerRise: 4,
      rightRunPerRise: 4,
      cutDepthFt: 0.25,
    } as const
    const berm = bermDesign({ ...job, cutChannel })
    const channelAreaFt2 = 3 * 0.25 + 4 * 0.25 ** 2
    expect(berm.channelCutYd3).toBeCloseTo((channelAreaFt2 * 78) / 27, 10)
    expect(berm.earthBankYd3).toBeCloseTo(berm.earthCompactedYd3 / 0.9 - berm.channelCutYd3, 10)
    const q = 1 / 30
    const ridgeFt = berm.crestAboveChannelFt - 0.25
    expect(berm.settledHeightFt).toBeCloseTo(ridgeFt + q * (2 + 4 * ridgeFt), 10)
    const deep = { ...cutChannel, cutDepthFt: 5 }
    expect(() => bermDesign({ ...job, cutChannel: deep })).toThrow(refusal('cutChannel.cutDepthFt'))
  })

  it('shares the flow over both arms by length, and the larger sizes the berm', () => {
    const both = bermDesign({ ...job, falls: 'both', pastEdgeFt: { left: 45, right: 15 } })
    expect(both.ends.map(({ armLengthFt }) => armLengthFt)).toEqual([54, 24])
    expect(both.ends.map(({ armFlowCfs }) => armFlowCfs).reduce((a, b) => a + b)).toBeCloseTo(job.flowCfs, 10)
    expect(both.armFlowCfs).toBeCloseTo((job.flowCfs * 54) / 78, 10)
    expect(both.channelFallFt).toBeCloseTo(54 * 0.008, 12)
    expect(both.depthFt).toBeLessThan(bermDesign(job).depthFt)
  })

  it('counts the ramp cut slopes on both sides in its length', () => {
    expect(bermDesign({ ...job, rampEdgeCutFt: 3 }).lengthFt).toBe(84)
  })

  it('goes on without an outlet, so that the check can name it', () => {
    expect(bermDesign({ ...job, outlets: [] }).ends[0]).not.toHaveProperty('outlet')
  })

  it('says when the flow is near critical, and that a grass curve is from memory', () => {
    const fast = bermDesign({ ...job, channelGradeFtPerFt: 0.05 })
    expect(fast.froude).toBeGreaterThan(0.8)
    expect(fast.notes.join()).toContain('Froude')
    const grass = bermDesign({
      ...job,
      resistanceHigh: { retardance: 'B' },
      resistanceLow: { retardance: 'D' },
    })
    expect(grass.notes.join()).toContain('from memory, verify')
    expect(grass.depthFt).toBeGreaterThan(grass.lowResistanceDepthFt)
  })

  it('grows with the flow', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.1, max: 60, noNaN: true }), (flowCfs) => {
        const berm = bermDesign({ ...job, flowCfs })
        const larger = bermDesign({ ...job, flowCfs: flowCfs * 1.1 })
        expect(larger.depthFt).toBeGreaterThan(berm.depthFt)
        expect(larger.earthCompactedYd3).toBeGreaterThanOrEqual(berm.earthCompactedYd3)
        expect(berm.velocityFtPerS).toBeGreaterThan(berm.capacityVelocityFtPerS)
      }),
      { numRuns: 40 },
    )
  })

  it.each([
    ['flowCfs', { flowCfs: NaN }],
    ['channelGradeFtPerFt', { channelGradeFtPerFt: 0 }],
    ['freeboardFt', { freeboardFt: -0.1 }],
    ['minimumHeightFt', { minimumHeightFt: Infinity }],
    ['rampWidthFt', { rampWidthFt: 0 }],
    ['rampEdgeCutFt', { rampEdgeCutFt: NaN }],
    ['pastEdgeFt.left', { pastEdgeFt: { left: -1, right: 15 } }],
    ['pastEdgeFt.right', { pastEdgeFt: { left: 1, right: NaN } }],
    ['resistanceHigh.roughness', { resistanceHigh: { roughness: 0 } }],
    ['resistanceLow.roughness', { resistanceLow: { roughness: NaN } }],
    ['resistanceLow', { resistanceLow: { roughness: 0.2 } }],
    ['resistanceLow.retardance', { resistanceLow: { retardance: 'Z' } as never }],
    ['settlementPercent', { settlementPercent: -1 }],
    ['shrinkPercent', { shrinkPercent: 100 }],
    ['crossing.lengthFt', { crossing: { lengthFt: 100 } }],
    ['crossing.sideRunPerRise', { crossing: { lengthFt: 10, sideRunPerRise: 0 } }],
    ['downslopeRunPerRise', { downslopeRunPerRise: 40 }],
  ])('refuses a bad %s by name', (field, change) => {
    expect(() => bermDesign({ ...job, ...change })).toThrow(refusal(field))
  })
})
