import { describe, expect, it } from 'vitest'
import { compositeCurveNumber } from './composite-curve-number.js'

const refusal = (field: string) => expect.objectContaining({ name: 'EngineeringInputError', field })

describe('compositeCurveNumber', () => {
  it('gives 68.0 for 23.9 % of 98, 36.8 % of 55.6 and 39.3 % of 61.4 (published drainage study, Maryland)', () => {
    const parts = [
      { areaAcres: 23.9, curveNumber: 98 },
      { areaAcres: 36.8, curveNumber: 55.6 },
      { areaAcres: 39.3, curveNumber: 61.4 },
    ]
    expect(Math.abs(compositeCurveNumber({ parts }) - 68)).toBeLessThan(0.05)
  })

  it('does not depend on the unit of area', () => {
    const parts = [
      { areaAcres: 1, curveNumber: 61 },
      { areaAcres: 3, curveNumber: 79 },
    ]
    const scaled = parts.map((part) => ({ ...part, areaAcres: part.areaAcres * 43560 }))
    expect(compositeCurveNumber({ parts })).toBeCloseTo(74.5, 12)
    expect(compositeCurveNumber({ parts: scaled })).toBeCloseTo(74.5, 9)
  })

  it('names the part that is wrong', () => {
    expect(() => compositeCurveNumber({ parts: [] })).toThrow(refusal('parts'))
    expect(() => compositeCurveNumber({ parts: [{ areaAcres: 0, curveNumber: 70 }] })).toThrow(
      refusal('parts[0].areaAcres'),
    )
    const second = [
      { areaAcres: 1, curveNumber: 70 },
      { areaAcres: 1, curveNumber: 20 },
    ]
    expect(() => compositeCurveNumber({ parts: second })).toThrow(refusal('parts[1].curveNumber'))
  })
})
