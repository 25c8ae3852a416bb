import { describe, expect, it } from 'vitest'
import { averageEndAreaYd3, type EndAreaSection } from './average-end-area-yd3.js'

const at = (stationFt: number, cutAreaFt2: number, fillAreaFt2 = 0): EndAreaSection => ({
  stationFt,
  cutAreaFt2,
  fillAreaFt2,
})

describe('averageEndAreaYd3', () => {
  it('adds 3,450 + 12,200 + 24,650 + 15,900 to 56,200 ft3 (Vose, Handbook of Railroad Construction, printed end areas)', () => {
    const sections = [at(0, 0), at(50, 137), at(100, 350), at(150, 637), at(200, 0)]
    // The book rounds each of its four products to the nearest 50 ft3.
    expect(averageEndAreaYd3({ sections }).cutYd3 * 27).toBeCloseTo(56200, 6)
  })

  it('gives 50 and 150 ft2 at 50 ft 5,000 ft3 (published engineering forum example, recomputed)', () => {
    expect(averageEndAreaYd3({ sections: [at(0, 50), at(50, 150)] })).toEqual({
      cutYd3: 5000 / 27,
      fillYd3: 0,
    })
  })

  it('splits pure cut against pure fill at the zero point L·A1/(A1 + A2)', () => {
    const { cutYd3, fillYd3 } = averageEndAreaYd3({ sections: [at(0, 30), at(40, 0, 10)] })
    expect(cutYd3 * 27).toBeCloseTo((30 * 30) / 2, 10)
    expect(fillYd3 * 27).toBeCloseTo((10 * 10) / 2, 10)
    const back = averageEndAreaYd3({ sections: [at(0, 0, 10), at(40, 30)] })
    expect(back.cutYd3).toBeCloseTo(cutYd3, 12)
    expect(back.fillYd3).toBeCloseTo(fillYd3, 12)
  })

  it('averages each kind by itself where a section has both', () => {
    const { cutYd3, fillYd3 } = averageEndAreaYd3({ sections: [at(0, 30, 4), at(40, 0, 10)] })
    expect([cutYd3 * 27, fillYd3 * 27]).toEqual([600, expect.closeTo(280, 10)])
  })

  it('tapers over the whole length to a section without any area', () => {
    expect(averageEndAreaYd3({ sections: [at(0, 30), at(40, 0)] }).cutYd3 * 27).toBeCloseTo(600, 10)
  })

  it.each<[EndAreaSection[], string]>([
    [[], 'sections'],
    [[at(0, 1)], 'sections'],
    [[at(0, 1), at(0, 2)], 'sections[1].stationFt'],
    [[at(5, 1), at(4, 2)], 'sections[1].stationFt'],
    [[at(0, -1), at(1, 1)], 'sections[0].cutAreaFt2'],
    [[at(0, 1), at(1, 1, NaN)], 'sections[1].fillAreaFt2'],
    [[at(0, 1), at(Infinity, 1)], 'sections[1].stationFt'],
  ])('refuses %o', (sections, field) => {
    expect(() => averageEndAreaYd3({ sections })).toThrow(expect.objectContaining({ field }))
  })
})
