import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { graphicalPeak, type GraphicalPeakInput } from './graphical-peak.js'
import { peakDischargeCfs } from './peak-discharge-cfs.js'
import { unitPeakTable } from './unit-peak-table.js'

const refusal = (field: string) => expect.objectContaining({ name: 'EngineeringInputError', field })

const example41: GraphicalPeakInput = {
  areaAcres: 250,
  curveNumber: 75,
  rainfallIn: 6,
  timeOfConcentrationHr: 1.53,
  distribution: 'II',
}

const job: GraphicalPeakInput = {
  areaAcres: 1.8,
  curveNumber: 79,
  rainfallIn: 4.8,
  timeOfConcentrationHr: 0.12203913052933639,
  distribution: 'II',
}

describe('graphicalPeak', () => {
  it('gives 345 cfs and qu 270 csm/in within 0.5 % (USDA NRCS TR-55, 1986, example 4-1)', () => {
    const { peakCfs, unitPeakCsmPerIn, iaOverP } = graphicalPeak(example41)
    expect(Math.abs(peakCfs / 345 - 1)).toBeLessThan(0.005)
    expect(Math.abs(unitPeakCsmPerIn / 270 - 1)).toBeLessThan(0.005)
    expect(iaOverP).toBeCloseTo(0.111, 3)
  })

  it('gives 258 cfs when 3 % of the area is ponds (USDA NRCS TR-55, 1986, example 4-1 with pond factor 0.75)', () => {
    const { peakCfs, pondFactor } = graphicalPeak({ ...example41, pondPercent: 3 })
    expect(pondFactor).toBe(0.75)
    expect(Math.abs(peakCfs / 258.2 - 1)).toBeLessThan(0.005)
  })

  it('gives 1.362 cfs on 0.0192 square mile within the reading of the chart (published permit calculation)', () => {
    const { peakCfs, iaOverP } = graphicalPeak({
      areaAcres: 0.0192 * 640,
      curveNumber: 75,
      rainfallIn: 1.5,
      timeOfConcentrationHr: 0.257,
      distribution: 'II',
    })
    expect(Math.abs(peakCfs / 1.362 - 1)).toBeLessThan(0.01)
    expect(iaOverP).toBeCloseTo(0.444, 3)
  })

  it('gives qu 946.52 and 7.00200 cfs (constructed example, no outside evidence)', () => {
    const result = graphicalPeak(job)
    expect(result.initialAbstractionIn).toBeCloseTo(0.5316455696202532, 12)
    expect(result.iaOverP).toBeCloseTo(0.1107594936708861, 12)
    expect(result.unitPeakCsmPerIn).toBeCloseTo(946.5156709075554, 8)
    expect(result.peakCfs).toBeCloseTo(7.002002987745496, 10)
    expect(result.notes).toEqual([])
    expect(peakDischargeCfs({ ...job, method: 'graphical' })).toBe(result.peakCfs)
  })

  it('raises a time below 0.1 h to 0.1 h and says so', () => {
    const short = graphicalPeak({ ...job, timeOfConcentrationHr: 0.04 })
    expect(short.timeUsedHr).toBe(0.1)
    expect(short.notes).toHaveLength(1)
    expect(short.peakCfs).toBe(graphicalPeak({ ...job, timeOfConcentrationHr: 0.1 }).peakCfs)
  })

  it('uses the end row when Ia/P lies outside the table and says so', () => {
    const dry = graphicalPeak({ ...job, curveNumber: 55, rainfallIn: 2 })
    expect(dry.iaOverP).toBeGreaterThan(0.5)
    expect(dry.iaOverPUsed).toBe(0.5)
    expect(dry.notes.join()).toContain('end row')
    expect(graphicalPeak({ ...job, curveNumber: 98 }).iaOverPUsed).toBe(0.1)
  })

  it('gives 0 cfs when nothing runs off, also without rain', () => {
    expect(graphicalPeak({ ...job, rainfallIn: 0 }).peakCfs).toBe(0)
    expect(graphicalPeak({ ...job, rainfallIn: 0, curveNumber: 100 }).peakCfs).toBe(0)
  })

  it("takes a district's own rows as it takes the table's", () => {
    const own = graphicalPeak({ ...job, distribution: { rows: unitPeakTable.II } })
    expect(own.peakCfs).toBe(graphicalPeak(job).peakCfs)
  })

  it('meets the printed row exactly where Ia/P stands in the table (USDA NRCS TR-55, 1986, table F-1)', () => {
    // At Tc = 1 h the logarithm is 0, so qu is 10^C0 of the row.
    const rows = [{ iaOverP: 0.2, c0: 2.23537, c1: -0.50387, c2: -0.08929 }]
    const { unitPeakCsmPerIn } = graphicalPeak({ ...job, timeOfConcentrationHr: 1, distribution: { rows } })
    expect(unitPeakCsmPerIn).toBeCloseTo(10 ** 2.23537, 9)
  })

  it('rises with rain and area, in proportion to area', () => {
    const scale = fc.double({ min: 0.01, max: 50, noNaN: true })
    const rain = fc.double({ min: 0.5, max: 12, noNaN: true })
    fc.assert(
      fc.property(
        scale,
        rain,
        fc.constantFrom('I', 'IA', 'II', 'III'),
        (factor, rainfallIn, distribution) => {
          const base = graphicalPeak({ ...job, rainfallIn, distribution }).peakCfs
          const wide = graphicalPeak({ ...job, rainfallIn, distribution, areaAcres: 1.8 * factor }).peakCfs
          expect(wide).toBeCloseTo(base * factor, 6)
          expect(
            graphicalPeak({ ...job, rainfallIn: rainfallIn + 0.5, distribution }).peakCfs,
          ).toBeGreaterThanOrEqual(base)
        },
      ),
    )
  })

  it.each([
    ['areaAcres', { areaAcres: 0 }],
    ['areaAcres', { areaAcres: NaN }],
    ['curveNumber', { curveNumber: 40 }],
    ['curveNumber', { curveNumber: 101 }],
    ['rainfallIn', { rainfallIn: -1 }],
    ['timeOfConcentrationHr', { timeOfConcentrationHr: 10.1 }],
    ['timeOfConcentrationHr', { timeOfConcentrationHr: -0 }],
    ['pondPercent', { pondPercent: 101 }],
    ['distribution', { distribution: { rows: [] } }],
    [
      'distribution.rows[1].iaOverP',
      { distribution: { rows: [unitPeakTable.II[1] ?? [], unitPeakTable.II[0] ?? []] } as never },
    ],
  ])('refuses a bad %s by name', (field, change) => {
    expect(() => graphicalPeak({ ...job, ...change })).toThrow(refusal(field))
  })
})
