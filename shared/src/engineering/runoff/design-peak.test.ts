import { describe, expect, it } from 'vitest'
import type { DesignPeakInput } from './design-peak-types.js'
import { designPeak } from './design-peak.js'

const refusal = (field: string) => expect.objectContaining({ name: 'EngineeringInputError', field })

const job: DesignPeakInput = {
  methods: ['graphical', 'rational'],
  areaAcres: 1.8,
  curveNumber: 79,
  rainfallIn: 4.8,
  timeOfConcentration: { method: 'lag', flowLengthFt: 420, curveNumber: 79, landSlopePercent: 5 },
  distribution: 'II',
  rational: {
    runoffCoefficient: 0.36,
    intensities: [
      { durationMin: 5, intensityInPerHr: 7.2 },
      { durationMin: 10, intensityInPerHr: 5.76 },
    ],
  },
}

describe('designPeak', () => {
  it('takes the larger of 7.00200 and 4.12639 cfs and says so (constructed example, no outside evidence)', () => {
    const result = designPeak(job)
    expect(result.designPeakCfs).toBeCloseTo(7.002002987745496, 10)
    expect(result.governs).toBe('graphical')
    expect(result.reason).toContain('graphical')
    expect(result.rational).toMatchObject({
      intensityInPerHr: expect.closeTo(6.367886832745804, 10),
      peakCfs: expect.closeTo(4.1263906676192805, 10),
    })
    expect(result.notes).toEqual([])
  })

  it('lets the rational method govern when its peak is larger', () => {
    const steep = {
      ...job,
      rational: { runoffCoefficient: 0.9, intensities: job.rational?.intensities ?? [] },
    }
    expect(designPeak(steep).governs).toBe('rational')
  })

  it('goes on with the other method when one is outside its limits of use', () => {
    const result = designPeak({ ...job, curveNumber: 38 })
    expect(result.graphical).toEqual({ refused: expect.stringContaining('curveNumber is 38') })
    expect(result.governs).toBe('rational')
    expect(result.reason).toContain('refused')
  })

  it('refuses the rational method when no intensity reaches the time of concentration', () => {
    const late = { ...job, timeOfConcentration: { method: 'given', timeOfConcentrationHr: 0.5 } } as const
    expect(designPeak(late).rational).toEqual({ refused: expect.stringContaining('30.0 min') })
    expect(designPeak(late).governs).toBe('graphical')
  })

  it('never reads an intensity under 5 minutes and says so', () => {
    const soon = { ...job, timeOfConcentration: { method: 'given', timeOfConcentrationHr: 0.02 } } as const
    const result = designPeak(soon)
    expect(result.rational).toMatchObject({ intensityInPerHr: 7.2, timeUsedHr: 5 / 60 })
    expect(result.notes.join()).toContain('5 min')
    expect(result.notes.join()).toContain('0.1 h')
  })

  it('says when it goes past a limit that is only from memory, and does not refuse', () => {
    const near = {
      ...job,
      timeOfConcentration: { method: 'lag', flowLengthFt: 150, curveNumber: 79, landSlopePercent: 5 },
    } as const
    const result = designPeak(near)
    expect(result.graphical).toHaveProperty('peakCfs')
    expect(result.notes.join()).toContain('from memory, verify')
  })

  it('refuses by a limit that the district has entered itself', () => {
    const districtLimits = [
      {
        method: 'lag',
        field: 'flowLengthFt',
        unit: 'ft',
        min: 500,
        source: 'district setting',
        fromMemory: false,
      },
    ] as const
    expect(() => designPeak({ ...job, districtLimits })).toThrow(refusal('methods'))
    expect(() => designPeak({ ...job, districtLimits })).toThrow(/flowLengthFt is 420.*at least 500 ft/)
  })

  it('refuses when no method is left, with each reason', () => {
    expect(() => designPeak({ ...job, methods: ['graphical'], curveNumber: 35 })).toThrow(refusal('methods'))
    expect(() => designPeak({ ...job, methods: [] })).toThrow(/methods is empty/)
  })

  it.each([
    ['areaAcres', { areaAcres: NaN }],
    ['curveNumber', { curveNumber: 20 }],
    ['rational', { rational: undefined as never }],
    ['rational.intensities', { rational: { runoffCoefficient: 0.3, intensities: [] } }],
    [
      'rational.intensities[1].durationMin',
      {
        rational: {
          runoffCoefficient: 0.3,
          intensities: [
            { durationMin: 10, intensityInPerHr: 5 },
            { durationMin: 5, intensityInPerHr: 7 },
          ],
        },
      },
    ],
    [
      'timeOfConcentrationHr',
      { timeOfConcentration: { method: 'given', timeOfConcentrationHr: 0 } } as const,
    ],
  ])('refuses a bad %s by name', (field, change) => {
    expect(() => designPeak({ ...job, ...change })).toThrow(refusal(field))
  })
})
