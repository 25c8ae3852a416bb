import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { channelFlow } from './channel-flow.js'
import type { ChannelSection } from './channel-section.js'

const refusal = (field: string) => expect.objectContaining({ name: 'EngineeringInputError', field })

const trapezoid = (bottomWidthFt: number, z: number): ChannelSection => ({
  shape: 'trapezoid',
  bottomWidthFt,
  leftRunPerRise: z,
  rightRunPerRise: z,
})
const triangle = (z: number): ChannelSection => ({ shape: 'triangle', leftRunPerRise: z, rightRunPerRise: z })

describe('channelFlow', () => {
  it('carries 55.7 cfs at 4.7 ft/s, A 11.8, P 12.7 (FHWA HEC-22, 4th ed., 2024, example 6.1)', () => {
    const section = trapezoid(2.6, 3)
    const flow = channelFlow({ section, depthFt: 1.6, roughness: 0.03, slopeFtPerFt: 0.01 })
    expect(Math.abs(flow.areaFt2 - 11.8)).toBeLessThan(0.05)
    expect(Math.abs(flow.wettedPerimeterFt - 12.7)).toBeLessThan(0.05)
    expect(Math.abs(flow.flowCfs / 55.7 - 1)).toBeLessThan(0.005)
    expect(Math.abs(flow.velocityFtPerS - 4.7)).toBeLessThan(0.05)
  })

  it.each([
    [1, 22.1],
    [1.1, 27],
  ])('carries at %d ft of depth %d cfs (FHWA HEC-22, 4th ed., 2024, example 6.2)', (depthFt, printed) => {
    const section = trapezoid(3, 3)
    const { flowCfs } = channelFlow({ section, depthFt, roughness: 0.03, slopeFtPerFt: 0.01 })
    expect(Math.abs(flowCfs - printed)).toBeLessThan(0.06)
  })

  it('gives A 48, P 23.4164, Froude 0.302 for b 10, z 2, y 3 (published check value)', () => {
    const flow = channelFlow({ section: trapezoid(10, 2), depthFt: 3, roughness: 0.03, slopeFtPerFt: 0.001 })
    expect(flow.areaFt2).toBe(48)
    expect(flow.wettedPerimeterFt).toBeCloseTo(23.4164, 4)
    expect(Math.abs(flow.flowCfs - 121.33)).toBeLessThan(0.05)
    expect(flow.froude).toBeCloseTo(0.302, 3)
  })

  it('gives V 4.785 ft/s, Q 32.30 cfs, Froude 0.974 for a triangle of z 3, y 1.5 (published check value)', () => {
    const flow = channelFlow({ section: triangle(3), depthFt: 1.5, roughness: 0.035, slopeFtPerFt: 0.02 })
    expect(flow.velocityFtPerS).toBeCloseTo(4.785, 2)
    expect(flow.flowCfs).toBeCloseTo(32.3, 1)
    expect(flow.froude).toBeCloseTo(0.974, 3)
  })

  it('is a triangle where a trapezoid has no bottom', () => {
    const at = { depthFt: 0.7, roughness: 0.04, slopeFtPerFt: 0.01 }
    const flat = channelFlow({ section: trapezoid(0, 4), ...at })
    expect(flat).toEqual(channelFlow({ section: triangle(4), ...at }))
  })

  it('measures a parabola by its exact arc, which a fine polyline meets', () => {
    const flow = channelFlow({
      section: { shape: 'parabola', topWidthFt: 8, depthFt: 2 },
      depthFt: 3,
      roughness: 0.04,
      slopeFtPerFt: 0.01,
    })
    const halfWidth = 4 * Math.sqrt(3 / 2)
    const steps = 20000
    const at = (index: number) => {
      const x = -halfWidth + (2 * halfWidth * index) / steps
      return { x, y: 2 * (x / 4) ** 2 }
    }
    let arc = 0
    for (let index = 0; index < steps; index += 1) {
      arc += Math.hypot(at(index + 1).x - at(index).x, at(index + 1).y - at(index).y)
    }
    expect(flow.topWidthFt).toBeCloseTo(2 * halfWidth, 12)
    expect(flow.wettedPerimeterFt).toBeCloseTo(arc, 6)
    expect(flow.areaFt2).toBeCloseTo((2 / 3) * 2 * halfWidth * 3, 10)
  })

  it('is all zero at depth 0, not NaN', () => {
    const flow = channelFlow({ section: triangle(4), depthFt: -0, roughness: 0.04, slopeFtPerFt: 0.01 })
    expect(Object.values(flow)).toEqual([0, 0, 0, 0, 0, 0, 0])
  })

  it('carries more when deeper, and goes with the root of the slope', () => {
    const depth = fc.double({ min: 0.01, max: 20, noNaN: true })
    fc.assert(
      fc.property(depth, fc.constantFrom(triangle(3), trapezoid(4, 1)), (depthFt, section) => {
        const base = channelFlow({ section, depthFt, roughness: 0.04, slopeFtPerFt: 0.01 })
        const steep = channelFlow({ section, depthFt, roughness: 0.04, slopeFtPerFt: 0.04 })
        const deep = channelFlow({ section, depthFt: depthFt * 1.01, roughness: 0.04, slopeFtPerFt: 0.01 })
        expect(steep.flowCfs / base.flowCfs).toBeCloseTo(2, 10)
        expect(deep.flowCfs).toBeGreaterThan(base.flowCfs)
      }),
    )
  })

  it.each([
    ['depthFt', { depthFt: -0.1 }],
    ['depthFt', { depthFt: NaN }],
    ['roughness', { roughness: 0 }],
    ['slopeFtPerFt', { slopeFtPerFt: 0 }],
    ['slopeFtPerFt', { slopeFtPerFt: Infinity }],
    ['section.leftRunPerRise', { section: triangle(-1) }],
    ['section.leftRunPerRise', { section: triangle(0) }],
    ['section.bottomWidthFt', { section: trapezoid(0, 0) }],
    ['section.bottomWidthFt', { section: trapezoid(NaN, 2) }],
    ['section.depthFt', { section: { shape: 'parabola', topWidthFt: 4, depthFt: 0 } as const }],
    ['section.topWidthFt', { section: { shape: 'parabola', topWidthFt: 0, depthFt: 1 } as const }],
    ['section.shape', { section: { shape: 'circle' } as never }],
  ])('refuses a bad %s by name', (field, change) => {
    const good = { section: triangle(3), depthFt: 1, roughness: 0.03, slopeFtPerFt: 0.01 }
    expect(() => channelFlow({ ...good, ...change })).toThrow(refusal(field))
  })
})
