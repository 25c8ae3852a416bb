import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { rockLayers, type RockLayersInput } from './rock-layers.js'

const gravel = { name: 'gravel', stoneSizeIn: 2, thicknessIn: 6, unitWeightTonsPerYd3: 1.42, wastePercent: 0 }
const slab = (lengthFt: number, widthFt: number, layer: Partial<typeof gravel>) =>
  rockLayers({ slopeLengthFt: lengthFt, widthFt, edgeRunPerRise: 0, layers: [{ ...gravel, ...layer }] })

const stone = { unitWeightTonsPerYd3: 1.35, wastePercent: 5, truckTons: 18, thicknessIn: 6 }
const ramp: RockLayersInput = {
  slopeLengthFt: 56.43580423808985,
  widthFt: 18,
  edgeRunPerRise: 1.5,
  layers: [
    { ...stone, name: 'surface stone', stoneSizeIn: 2 },
    { ...stone, name: 'base stone', stoneSizeIn: 4 },
  ],
}

describe('rockLayers', () => {
  it.each([
    [20, 20, { thicknessIn: 6, unitWeightTonsPerYd3: 1.42 }, 10.52, 2],
    [30, 10, { thicknessIn: 3, unitWeightTonsPerYd3: 1.4 }, 3.889, 3],
    [500, 12, { thicknessIn: 2, unitWeightTonsPerYd3: 2.2 }, 81.48, 2],
  ])(
    'weighs a flat bed of %d by %d ft as printed by the trade, without rounding a step',
    (length, width, layer, tons, digits) => {
      expect(slab(length, width, layer).totalTons).toBeCloseTo(tons, digits)
    },
  )

  it('gives 15 yd3 at 2,700 lb/yd3 20.25 tons (EPA factor for crushed stone)', () => {
    expect(slab(27, 30, { unitWeightTonsPerYd3: 1.35 }).totalTons).toBeCloseTo(20.25, 10)
  })

  it('gives both layers of a ramp with sloping edges (constructed example, no outside evidence)', () => {
    const { layers, totalTons, totalOrderTons, totalThicknessIn } = rockLayers(ramp)
    expect(layers[0]).toMatchObject({ topDepthFt: 0, bottomDepthFt: 0.5, loads: 2 })
    expect(layers[0]?.volumeFt3).toBeCloseTo(529.0856647320924, 9)
    expect(layers[0]?.tons).toBeCloseTo(26.454283236604624, 10)
    expect(layers[0]?.orderTons).toBeCloseTo(27.776997398434858, 10)
    expect(layers[1]).toMatchObject({ topDepthFt: 0.5, bottomDepthFt: 1, loads: 2 })
    expect(layers[1]?.volumeYd3).toBeCloseTo(21.163426589283695, 10)
    expect(layers[1]?.orderTons).toBeCloseTo(29.999157190309642, 10)
    expect(totalTons).toBeCloseTo(55.024909132137616, 10)
    expect(totalOrderTons).toBeCloseTo(57.776154588744504, 10)
    expect(totalThicknessIn).toBe(12)
  })

  it('holds as much in one thick layer as in thin ones that make it up', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 30 }),
        fc.integer({ min: 1, max: 30 }),
        fc.integer({ min: 0, max: 40 }),
        (upperIn, lowerIn, edgeTenths) => {
          const of = (thicknesses: number[]) =>
            rockLayers({
              ...ramp,
              edgeRunPerRise: edgeTenths / 10,
              layers: thicknesses.map((thicknessIn, index) => ({
                ...gravel,
                name: `layer ${index}`,
                thicknessIn,
              })),
            }).totalVolumeYd3
          expect(of([upperIn, lowerIn])).toBeCloseTo(of([upperIn + lowerIn]), 8)
        },
      ),
    )
  })

  it('does not send another truck for a load that just fits', () => {
    const full = { ...gravel, thicknessIn: 12, unitWeightTonsPerYd3: 1.2, wastePercent: 0, truckTons: 18 }
    const { layers } = rockLayers({ slopeLengthFt: 27, widthFt: 15, edgeRunPerRise: 0, layers: [full] })
    expect(layers[0]?.loads).toBe(1)
  })

  it('buys extra stone with the layer it is named for, and leaves loads out when no truck is given', () => {
    const { layers } = rockLayers({
      ...ramp,
      extra: [{ name: 'toe key', volumeFt3: 27, layer: 'base stone' }],
    })
    expect(layers[1]?.extraFt3).toBe(27)
    expect(layers[1]?.volumeYd3).toBeCloseTo(22.163426589283695, 10)
    expect(layers[0]?.extraFt3).toBe(0)
    expect(slab(1, 1, {}).layers[0]).not.toHaveProperty('loads')
  })

  it.each<[Partial<RockLayersInput>, string]>([
    [{ slopeLengthFt: 0 }, 'slopeLengthFt'],
    [{ widthFt: NaN }, 'widthFt'],
    [{ widthFt: 0 }, 'widthFt'],
    [{ edgeRunPerRise: -1 }, 'edgeRunPerRise'],
    [{ layers: [] }, 'layers'],
    [{ layers: [{ ...gravel, thicknessIn: 0 }] }, 'layers[0].thicknessIn'],
    [{ layers: [gravel, { ...gravel, unitWeightTonsPerYd3: 0 }] }, 'layers[1].unitWeightTonsPerYd3'],
    [{ layers: [{ ...gravel, wastePercent: -1 }] }, 'layers[0].wastePercent'],
    [{ layers: [{ ...gravel, truckTons: 0 }] }, 'layers[0].truckTons'],
    [{ layers: [{ ...gravel, stoneSizeIn: Infinity }] }, 'layers[0].stoneSizeIn'],
    [{ extra: [{ name: 'key', volumeFt3: 1, layer: 'cap' }] }, 'extra[0].layer'],
    [{ extra: [{ name: 'key', volumeFt3: -1, layer: 'base stone' }] }, 'extra[0].volumeFt3'],
  ])('refuses %o', (change, field) => {
    expect(() => rockLayers({ ...ramp, ...change })).toThrow(expect.objectContaining({ field }))
  })
})
