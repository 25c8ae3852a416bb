import { describe, expect, it } from 'vitest'
import { groundLineFromNotes } from './ground-line-from-notes.js'
import { type LevelRow, reduceLevelNotes } from './reduce-level-notes.js'

const run = (rows: LevelRow[], more: object = {}) =>
  reduceLevelNotes({ startElevationFt: 100, rows, ...more })

/** Profile run with intermediate sights, metres in the source; the arithmetic has no unit. */
const civilRun: LevelRow[] = [
  { label: 'OBM1', backsightFt: 1.717 },
  { label: 'A', intermediateFt: 1.432 },
  { label: 'B', backsightFt: 2.918, foresightFt: 1.716 },
  { label: 'C', intermediateFt: 2.272 },
  { label: 'D', backsightFt: 0.816, foresightFt: 0.953 },
  { label: 'E', backsightFt: 1.436, foresightFt: 3.005 },
  { label: 'CP', backsightFt: 1.246, foresightFt: 1.391 },
  { label: 'F', intermediateFt: 1.353 },
  { label: 'G', intermediateFt: 1.462 },
  { label: 'OBM2', foresightFt: 0.628 },
]

const pondRows: LevelRow[] = [
  { label: 'BM-1', backsightFt: 4.86 },
  { label: '0+00', stationFt: 0, intermediateFt: 5.86 },
  { label: '0+42', stationFt: 42, intermediateFt: 7.36 },
  { label: 'TP-1', stationFt: 49, backsightFt: 3.52, foresightFt: 9.46 },
  { label: '1+00', stationFt: 100, intermediateFt: 8.52 },
  { label: 'Water edge', intermediateFt: 4.52 },
  { label: 'TP-2', backsightFt: 7.35, foresightFt: 1.9 },
  { label: 'BM-1 (close)', foresightFt: 4.36 },
]
const pondClosing = { knownElevationFt: 104.2, lengthMiles: 0.06, coefficientFt: 0.1 }

describe('reduceLevelNotes', () => {
  it('reduces a profile run with intermediate sights (published teaching example, Universiti Sains Malaysia, recomputed)', () => {
    const reduced = reduceLevelNotes({
      startElevationFt: 29.23,
      rows: civilRun,
      closing: { knownElevationFt: 29.66, perSetupFt: 0.02 },
      adjust: true,
    })
    expect(reduced.points.map((point) => point.elevationFt)).toEqual([
      29.23, 29.515, 29.231, 29.877, 31.196, 29.007, 29.052, 28.945, 28.836, 29.67,
    ])
    expect(reduced.points.map((point) => point.instrumentHeightFt)).toEqual([
      30.947, 30.947, 32.149, 32.149, 32.012, 30.443, 30.298, 30.298, 30.298, 30.298,
    ])
    expect(reduced).toMatchObject({
      sumBacksightFt: 8.133,
      sumForesightFt: 7.693,
      differenceFt: 0.44,
      setups: 5,
    })
    expect(reduced).toMatchObject({ misclosureFt: 0.01, arithmeticCheckPasses: true, closes: true })
    const corrections = reduced.points.map(
      (point) => ((point.adjustedElevationFt ?? NaN) - point.elevationFt) * 1000,
    )
    const published = [0, -2, -2, -4, -4, -6, -8, -10, -10, -10]
    published.forEach((millimetres, index) => expect(corrections[index]).toBeCloseTo(millimetres, 6))
  })

  it('reduces a closed section in feet with a misclosure of +0.04 ft (university exercise, recomputed)', () => {
    const reduced = run(
      [
        { label: 'BM A', backsightFt: 3.1 },
        { label: 'TP1', backsightFt: 6.44, foresightFt: 9.82 },
        { label: 'TP2', backsightFt: 8.76, foresightFt: 6.96 },
        { label: 'TP3', backsightFt: 7.12, foresightFt: 3.27 },
        { label: 'BM B', foresightFt: 10.42 },
      ],
      { closing: { knownElevationFt: 94.91, perSetupFt: 0.02, minimumFt: 0.03 } },
    )
    expect(reduced.points.map((point) => point.elevationFt)).toEqual([100, 93.28, 92.76, 98.25, 94.95])
    expect(reduced).toMatchObject({ sumBacksightFt: 25.42, sumForesightFt: 30.47, differenceFt: -5.05 })
    expect(reduced).toMatchObject({
      misclosureFt: 0.04,
      allowableFt: 0.04,
      allowableRule: 'setups',
      closes: true,
    })
  })

  it('reduces a mixed run with opening 100.000 and closing 98.051 (open-source levelling example, recomputed)', () => {
    const reduced = run([
      { label: 'A', backsightFt: 1.751 },
      { label: 'B', intermediateFt: 0.54 },
      { label: 'C', backsightFt: 0.3, foresightFt: 2.1 },
      { label: 'D', intermediateFt: 1.1 },
      { label: 'E', intermediateFt: 1.26 },
      { label: 'F', backsightFt: 1.5, foresightFt: 2.3 },
      { label: 'G', foresightFt: 1.1 },
    ])
    expect(reduced.points.map((point) => point.elevationFt)).toEqual([
      100, 101.211, 99.651, 98.851, 98.691, 97.651, 98.051,
    ])
    expect(reduced.differenceFt).toBe(-1.949)
    expect(reduced.closes).toBeUndefined()
  })

  it('closes a loop on its benchmark within 0.1 ft · √miles (constructed example, no outside evidence)', () => {
    const reduced = reduceLevelNotes({ startElevationFt: 104.2, rows: pondRows, closing: pondClosing })
    expect(reduced.points.map((point) => point.elevationFt)).toEqual([
      104.2, 103.2, 101.7, 99.6, 94.6, 98.6, 101.22, 104.21,
    ])
    expect(reduced.points.map((point) => point.instrumentHeightFt)).toEqual([
      109.06, 109.06, 109.06, 103.12, 103.12, 103.12, 108.57, 108.57,
    ])
    expect(reduced).toMatchObject({ sumBacksightFt: 15.73, sumForesightFt: 15.72, differenceFt: 0.01 })
    expect(reduced).toMatchObject({ misclosureFt: 0.01, closes: true, checkedAgainst: 'last-point' })
    expect(reduced.allowableFt).toBeCloseTo(0.0244949, 7)
  })

  it.each([
    [4.35, true],
    [4.34, false],
  ])(
    'with a last foresight of %d the loop closes: %s (constructed example, no outside evidence)',
    (foresightFt, closes) => {
      const rows = [...pondRows.slice(0, -1), { label: 'BM-1 (close)', foresightFt }]
      expect(reduceLevelNotes({ startElevationFt: 104.2, rows, closing: pondClosing }).closes).toBe(closes)
    },
  )

  it('checks against the last instrument height when the notes end on an intermediate sight', () => {
    const reduced = run(
      [
        { label: 'BM', backsightFt: 4.32 },
        { label: '0+00', intermediateFt: 5 },
      ],
      {
        closing: { knownElevationFt: 100, minimumFt: 0.02 },
      },
    )
    expect(reduced).toMatchObject({ checkedAgainst: 'last-instrument-height', arithmeticCheckPasses: true })
    expect(reduced.differenceFt).toBe(4.32)
    expect(reduced).not.toHaveProperty('closes')
    expect(reduced).not.toHaveProperty('misclosureFt')
  })

  it('leaves sights after the last foresight out of the check', () => {
    const reduced = run([
      { label: 'BM', backsightFt: 4 },
      { label: 'TP', foresightFt: 5 },
      { label: 'late', intermediateFt: 9 },
    ])
    expect(reduced).toMatchObject({
      checkedAgainst: 'last-point',
      differenceFt: -1,
      arithmeticCheckPasses: true,
    })
    expect(reduced.points.at(-1)?.elevationFt).toBe(95)
  })

  it('takes a negative reading as an inverted rod and a water depth from the water surface', () => {
    const reduced = run(
      [
        { label: 'BM', backsightFt: 4 },
        { label: 'branch', intermediateFt: -6.5 },
        { label: 'bed', stationFt: 60, waterDepthFt: 3.5 },
      ],
      { waterSurfaceFt: 98.6 },
    )
    expect(reduced.points.map((point) => point.elevationFt)).toEqual([100, 110.5, 95.1])
  })

  it('takes the line length in feet as well as in miles', () => {
    const closing = { knownElevationFt: 104.2, lengthFt: 0.06 * 5280, coefficientFt: 0.1 }
    const reduced = reduceLevelNotes({ startElevationFt: 104.2, rows: pondRows, closing })
    expect(reduced.allowableFt).toBeCloseTo(0.1 * Math.sqrt(0.06), 12)
    expect(reduced.allowableRule).toBe('length')
  })

  const start: LevelRow = { label: 'BM', backsightFt: 4 }
  it.each<[string, LevelRow[], string]>([
    ['no row', [], 'rows'],
    ['one row', [start], 'rows'],
    ['a first row without a backsight', [{ label: 'a', intermediateFt: 1 }, start], 'rows[0]'],
    ['a row without a sight', [start, { label: 'a' }], 'rows[1]'],
    [
      'an intermediate sight beside a foresight',
      [start, { label: 'a', intermediateFt: 1, foresightFt: 2 }],
      'rows[1]',
    ],
    [
      'an intermediate sight beside a backsight',
      [start, { label: 'a', intermediateFt: 1, backsightFt: 2 }],
      'rows[1]',
    ],
    ['a backsight alone below', [start, { label: 'a', backsightFt: 2 }], 'rows[1]'],
    ['a depth beside a reading', [start, { label: 'a', waterDepthFt: 1, foresightFt: 2 }], 'rows[1]'],
    ['a depth without a water surface', [start, { label: 'a', waterDepthFt: 1 }], 'waterSurfaceFt'],
    ['a reading that is no number', [start, { label: 'a', foresightFt: NaN }], 'rows[1].foresightFt'],
    [
      'two foresights of one setup',
      [start, { label: 'a', foresightFt: 1 }, { label: 'b', foresightFt: 2 }],
      'rows[2].foresightFt',
    ],
  ])('refuses %s', (_case, rows, field) => {
    expect(() => run(rows)).toThrow(expect.objectContaining({ field }))
  })

  it('names the row as a person counts it', () => {
    expect(() => run([start, { label: 'a' }])).toThrow(/^Row 2: /)
  })

  it.each([
    [{ knownElevationFt: 100 }, 'closing'],
    [{ knownElevationFt: 100, coefficientFt: 0.1 }, 'closing.lengthFt'],
    [{ knownElevationFt: NaN, minimumFt: 0.1 }, 'closing.knownElevationFt'],
    [{ knownElevationFt: 100, perSetupFt: 0 }, 'closing.perSetupFt'],
  ])('refuses the closing %o', (closing, field) => {
    expect(() => run([start, { label: 'a', foresightFt: 1 }], { closing })).toThrow(
      expect.objectContaining({ field }),
    )
  })
})

describe('groundLineFromNotes', () => {
  const { points } = reduceLevelNotes({
    startElevationFt: 104.2,
    rows: pondRows,
    closing: pondClosing,
    adjust: true,
  })

  it('keeps the points that have a station (constructed example, no outside evidence)', () => {
    expect(groundLineFromNotes({ points })).toEqual([
      { stationFt: 0, elevationFt: 103.2 },
      { stationFt: 42, elevationFt: 101.7 },
      { stationFt: 49, elevationFt: 99.6 },
      { stationFt: 100, elevationFt: 94.6 },
    ])
  })

  it('takes adjusted elevations when asked', () => {
    expect(groundLineFromNotes({ points, useAdjusted: true })[3]?.elevationFt).toBeCloseTo(
      94.6 - (0.01 * 2) / 3,
      9,
    )
  })

  it('puts a point shot later into its place by station', () => {
    const line = groundLineFromNotes({ points: [...points].reverse() })
    expect(line.map((point) => point.stationFt)).toEqual([0, 42, 49, 100])
  })

  it('refuses two shots at one station, and adjusted elevations that were never worked out', () => {
    expect(() => groundLineFromNotes({ points: [...points, ...points] })).toThrow(
      expect.objectContaining({ field: 'groundLine' }),
    )
    const plain = reduceLevelNotes({ startElevationFt: 104.2, rows: pondRows }).points
    expect(() => groundLineFromNotes({ points: plain, useAdjusted: true })).toThrow(
      expect.objectContaining({ field: 'useAdjusted' }),
    )
  })
})
