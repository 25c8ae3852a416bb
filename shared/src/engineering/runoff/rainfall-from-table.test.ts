import { describe, expect, it } from 'vitest'
import { rainfallFromTable } from './rainfall-from-table.js'
import { readRainfallTable } from './read-rainfall-table.js'

const refusal = (message: RegExp) =>
  expect.objectContaining({
    name: 'EngineeringInputError',
    field: 'text',
    message: expect.stringMatching(message),
  })

const ESTIMATES = `5-min:, 0.553,0.620,0.731,0.822,0.950,1.05,1.15,1.25,1.38,1.48
24-hr:, 4.01,4.76,6.09,7.28,9.05,10.5,12.1,13.7,16.1,18.0`

/** Rows of the 24-hour and 5-minute estimates as printed for Fort Myers, Florida. */
const FORT_MYERS = `Point precipitation frequency estimates (inches)
NOAA Atlas 14 Volume 9 Version 2
Data type: Precipitation depth
Time series type: Partial duration
Project area: Southeastern States
Location name (ESRI Maps): None
Station Name: None
Latitude: 26.6 Degree
Longitude: -81.9 Degree
Elevation (USGS): None None


PRECIPITATION FREQUENCY ESTIMATES
by duration for ARI (years):, 1,2,5,10,25,50,100,200,500,1000
${ESTIMATES}

Date/time (GMT):  Sun Jun  7 07:54:20 2026
`

const BOUNDS = FORT_MYERS.replace(
  'Date/time',
  `PRECIPITATION FREQUENCY ESTIMATES AT UPPER BOUND OF 90% CONFIDENCE INTERVAL
by duration for ARI (years):, 1,2,5,10,25,50,100,200,500,1000
${ESTIMATES.replaceAll('7.28', '8.60').replaceAll('9.05', '9.10')}

Date/time`,
)

const depth = (text: string, returnPeriodYr: number, durationHr = 24) =>
  rainfallFromTable({ text, returnPeriodYr, durationHr })

describe('rainfallFromTable', () => {
  it.each([
    [2, 4.76],
    [10, 7.28],
    [25, 9.05],
    [100, 12.1],
  ])(
    'reads the %d-year 24-hour depth %d in (NOAA Atlas 14 volume 9 version 2, Fort Myers FL)',
    (years, inches) => {
      expect(depth(FORT_MYERS, years)).toBe(inches)
    },
  )

  it('reads the estimate when the file repeats the table for its bounds', () => {
    expect(depth(BOUNDS, 10)).toBe(7.28)
  })

  it('reads the same depths whatever the line ends, byte-order mark, quotes and blanks', () => {
    expect(depth(`\uFEFF${FORT_MYERS.replaceAll('\n', '\r\n')}`, 10)).toBe(7.28)
    expect(depth(FORT_MYERS.replace('"', '').replace('7.28', '"7.28"'), 10)).toBe(7.28)
    expect(depth(FORT_MYERS.replaceAll(',', ' , '), 10)).toBe(7.28)
  })

  it('finds the column by its return period, not by place', () => {
    const swapped = FORT_MYERS.replace(
      '1,2,5,10,25,50,100,200,500,1000',
      '2,5,10,25,50,100,200,500,1000,2000',
    )
    expect(depth(swapped, 10)).toBe(6.09)
  })

  it('turns millimetres into inches', () => {
    const mm = FORT_MYERS.replace('(inches)', '(millimeters)')
    expect(depth(mm, 10)).toBeCloseTo(7.28 / 25.4, 12)
  })

  it('matches a duration by its label, not by equal floats', () => {
    expect(depth(FORT_MYERS, 10, 0.08333)).toBe(0.822)
    expect(depth(FORT_MYERS, 10, 5 / 60)).toBe(0.822)
  })

  it('is straight on log-log paper between two durations', () => {
    const middle = Math.sqrt((5 / 60) * 24)
    expect(depth(FORT_MYERS, 10, middle)).toBeCloseTo(Math.sqrt(0.822 * 7.28), 10)
  })

  it('never reads beyond the durations or between the return periods', () => {
    expect(() => depth(FORT_MYERS, 10, 48)).toThrow(/durationHr is 48; the table reaches from 5-min to 24-hr/)
    expect(() => depth(FORT_MYERS, 30)).toThrow(/returnPeriodYr is 30; the table has 1, 2, 5, 10/)
    expect(() => depth(FORT_MYERS, NaN)).toThrow(expect.objectContaining({ field: 'returnPeriodYr' }))
    expect(() => depth(FORT_MYERS, 10, 0)).toThrow(expect.objectContaining({ field: 'durationHr' }))
  })
})

describe('readRainfallTable', () => {
  it('keeps unit, series, volume, place and date of the file', () => {
    expect(readRainfallTable({ text: FORT_MYERS })).toMatchObject({
      units: 'inches',
      series: 'partial-duration',
      volume: 'NOAA Atlas 14 Volume 9 Version 2',
      durationLabels: ['5-min', '24-hr'],
      latitude: 26.6,
      longitude: -81.9,
      retrieved: 'Sun Jun  7 07:54:20 2026',
    })
  })

  it('reads an annual-maximum file only where it was asked for', () => {
    const annual = FORT_MYERS.replace('Partial duration', 'Annual maximum')
      .replace('ARI (years)', 'AEP')
      .replace('1,2,5,10,25,50,100,200,500,1000', '1/2,1/5,1/10,1/25,1/50,1/100,1/200,1/500,1/1000,1/2000')
    expect(() => readRainfallTable({ text: annual })).toThrow(refusal(/annual-maximum/))
    expect(readRainfallTable({ text: annual, series: 'annual-maximum' }).returnPeriodsYr[2]).toBe(10)
  })

  it.each([
    ['an empty file', '  \n', /empty/],
    ['another kind of file', 'station,elevation\n0,103.2\n', /no point-precipitation table/],
    [
      'a point outside every volume',
      "result = 'none';\nErrorMsg = 'Error 3.0: outside';\n",
      /Error 3\.0: outside/,
    ],
    ['intensities', FORT_MYERS.replace('Precipitation depth', 'Precipitation intensity'), /intensities/],
    ['intensities by unit', FORT_MYERS.replace('(inches)', '(inches/hour)'), /intensities/],
    ['an unknown unit', FORT_MYERS.replace('(inches)', '(feet)'), /unit/],
    ['a bound alone', FORT_MYERS.replace('FREQUENCY ESTIMATES', 'ESTIMATES AT UPPER BOUND'), /bound/],
    ['a row that falls', FORT_MYERS.replace('7.28', '5.28'), /Row 24-hr falls/],
    ['a missing depth', FORT_MYERS.replace('7.28', ''), /Row 24-hr must hold 10/],
    ['a short row', FORT_MYERS.replace(',18.0', ''), /Row 24-hr must hold 10/],
    ['durations out of order', FORT_MYERS.replace('5-min', '2-day'), /durations/],
    ['return periods out of order', FORT_MYERS.replace(' 1,2,5', ' 2,1,5'), /return periods/],
    ['no rows', FORT_MYERS.replace(ESTIMATES, ''), /no row/],
    ['a huge file', `${FORT_MYERS}${' '.repeat(200_001)}`, /more than 200000/],
  ])('refuses %s with one sentence', (_what, text, message) => {
    expect(() => readRainfallTable({ text })).toThrow(refusal(message))
  })
})
