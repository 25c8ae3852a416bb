import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { channelFlow } from './channel-flow.js'
import type { ChannelSection } from './channel-section.js'
import { normalDepth } from './normal-depth.js'
import { normalDepthFt } from './normal-depth-ft.js'

const refusal = (field: string) => expect.objectContaining({ name: 'EngineeringInputError', field })

const trapezoid = (bottomWidthFt: number, z: number): ChannelSection => ({
  shape: 'trapezoid',
  bottomWidthFt,
  leftRunPerRise: z,
  rightRunPerRise: z,
})
const triangle = (z: number): ChannelSection => ({ shape: 'triangle', leftRunPerRise: z, rightRunPerRise: z })
const swale: ChannelSection = { shape: 'parabola', topWidthFt: 25, depthFt: 2.5 }

describe('normalDepthFt', () => {
  it('gives 1.1 ft for 28 cfs (FHWA HEC-22, 4th ed., 2024, example 6.2)', () => {
    const depth = normalDepthFt({
      section: trapezoid(3, 3),
      flowCfs: 28,
      roughness: 0.03,
      slopeFtPerFt: 0.01,
    })
    expect(Math.abs(depth - 1.1)).toBeLessThan(0.05)
  })

  it('gives 1.9022 ft at 3.0737 ft/s in a parabolic swale (published calculator program example)', () => {
    const flow = normalDepth({ section: swale, flowCfs: 85, roughness: 0.05, slopeFtPerFt: 0.008 })
    expect(flow.depthFt).toBeCloseTo(1.9022, 4)
    expect(Math.abs(flow.velocityFtPerS - 3.0735)).toBeLessThan(0.0005)
  })

  it('gives 3.36 ft for 400 cfs, b 20, z 2 (Chow, Open-Channel Hydraulics, example 6-1, from memory, verify)', () => {
    const section = trapezoid(20, 2)
    const depth = normalDepthFt({ section, flowCfs: 400, roughness: 0.025, slopeFtPerFt: 0.0016 })
    expect(depth).toBeCloseTo(3.36, 2)
  })

  it('gives 3.816 ft in a rectangle of 10 ft at 200 cfs (published check value)', () => {
    const section = trapezoid(10, 0)
    const flow = normalDepth({ section, flowCfs: 200, roughness: 0.015, slopeFtPerFt: 0.001 })
    expect(flow.depthFt).toBeCloseTo(3.816, 3)
    expect(flow.froude).toBeCloseTo(0.473, 3)
  })

  it('gives 0.39 ft at 3.5 ft/s for 1.6 cfs in a V of 3:1 (published permit calculation)', () => {
    const flow = normalDepth({ section: triangle(3), flowCfs: 1.6, roughness: 0.03, slopeFtPerFt: 0.05 })
    expect(Math.abs(flow.depthFt - 0.4)).toBeLessThan(0.05)
    expect(Math.abs(flow.velocityFtPerS / 3.5 - 1)).toBeLessThan(0.03)
  })

  it('gives 2.24 ft for 47.24 cfs, not the 1.76 ft that the area put for the flow gave (published permit misprint)', () => {
    const at = { section: triangle(2), roughness: 0.045, slopeFtPerFt: 0.02 }
    // The printed depth does not say whether k was 1.486 or 1.49, which moves it by 0.003 ft.
    expect(Math.abs(normalDepthFt({ ...at, flowCfs: 47.24 }) - 2.24)).toBeLessThan(0.0075)
    expect(normalDepthFt({ ...at, flowCfs: 24.67 })).toBeCloseTo(1.76, 2)
  })

  it('gives 0.76720 and 0.54410 ft (constructed example, no outside evidence)', () => {
    const section: ChannelSection = { shape: 'triangle', leftRunPerRise: 30, rightRunPerRise: 4 }
    const at = { section, flowCfs: 7.002002987745496, slopeFtPerFt: 0.008 }
    expect(normalDepthFt({ ...at, roughness: 0.1 })).toBeCloseTo(0.7671962966174879, 9)
    expect(normalDepthFt({ ...at, roughness: 0.04 })).toBeCloseTo(0.5441003365107042, 9)
  })

  it('meets the closed form of a triangle, d = (Qn/(K√S))^(3/8)', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1e-4, max: 5000, noNaN: true }),
        fc.integer({ min: 1, max: 30 }),
        (Q, z) => {
          const K = 1.486 * z * (z / (2 * Math.sqrt(1 + z ** 2))) ** (2 / 3)
          const closed = ((Q * 0.03) / (K * Math.sqrt(0.01))) ** (3 / 8)
          const found = normalDepthFt({
            section: triangle(z),
            flowCfs: Q,
            roughness: 0.03,
            slopeFtPerFt: 0.01,
          })
          expect(Math.abs(found - closed)).toBeLessThan(1e-9)
        },
      ),
    )
  })

  it('gives back the flow that it was asked for, in every shape', () => {
    const shapes = fc.constantFrom(triangle(4), trapezoid(3, 2), swale)
    fc.assert(
      fc.property(shapes, fc.double({ min: 0.01, max: 1000, noNaN: true }), (section, flowCfs) => {
        const at = { section, roughness: 0.04, slopeFtPerFt: 0.01 }
        const depthFt = normalDepthFt({ ...at, flowCfs })
        expect(channelFlow({ ...at, depthFt }).flowCfs / flowCfs).toBeCloseTo(1, 6)
      }),
    )
  })

  it('is 0 for flow 0', () => {
    const at = { section: triangle(3), flowCfs: 0, slopeFtPerFt: 0.01 }
    expect(normalDepthFt({ ...at, roughness: 0.03 })).toBe(0)
    expect(normalDepthFt({ ...at, resistance: { retardance: 'C' } })).toBe(0)
  })

  it('refuses a flow that 1,000 ft of depth does not carry', () => {
    const at = { section: trapezoid(0.01, 0), roughness: 0.5, slopeFtPerFt: 1e-6 }
    expect(() => normalDepthFt({ ...at, flowCfs: 1e6 })).toThrow(refusal('flowCfs'))
  })

  it.each([
    ['flowCfs', { flowCfs: -1 }],
    ['flowCfs', { flowCfs: NaN }],
    ['roughness', { roughness: undefined as never }],
    ['slopeFtPerFt', { slopeFtPerFt: -0 }],
    ['resistance.retardance', { resistance: { retardance: 'F' } as never }],
  ])('refuses a bad %s by name', (field, change) => {
    const good = { section: triangle(3), flowCfs: 5, roughness: 0.03, slopeFtPerFt: 0.01 }
    expect(() => normalDepthFt({ ...good, ...change })).toThrow(refusal(field))
  })
})

describe('normalDepth over grass', () => {
  const grass = (retardance: 'A' | 'B' | 'C' | 'D' | 'E', flowCfs = 20) =>
    normalDepth({ section: trapezoid(6, 4), flowCfs, resistance: { retardance }, slopeFtPerFt: 0.02 })

  it('stands deeper and slower the taller the grass', () => {
    const depths = (['A', 'B', 'C', 'D', 'E'] as const).map((retardance) => grass(retardance).depthFt)
    expect(depths).toEqual([...depths].sort((a, b) => b - a))
    expect(new Set(depths).size).toBe(5)
  })

  it('finds the roughness that its own velocity and radius give', () => {
    const { velocityFtPerS, hydraulicRadiusFt, roughness, flowCfs } = grass('D')
    const ln = Math.log(velocityFtPerS * hydraulicRadiusFt)
    const onCurve = Math.exp(4.436 * (0.0133 * ln ** 2 - 0.0954 * ln + 0.297) - 4.16)
    expect(roughness).toBeCloseTo(onCurve, 9)
    expect(flowCfs).toBeCloseTo(20, 8)
  })

  it('says that its curve is from memory, and when it is held at the end of the curve', () => {
    expect(grass('C').notes.join()).toContain('from memory, verify')
    expect(grass('C').notes).toHaveLength(1)
    expect(grass('C', 0.05).notes).toHaveLength(2)
  })
})
