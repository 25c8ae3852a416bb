import { describe, expect, it } from 'vitest'
import { reduceSoFar } from './reduce-so-far'

const notes = (rows: unknown[], more = {}) => ({ kind: 'level-notes', startElevationFt: 100, rows, ...more })
const benchMark = { label: 'BM', backsightFt: 4 }
const ground = { label: 'a', stationFt: 0, intermediateFt: 5 }

describe('a survey that is still being typed', () => {
  it('keeps the elevations above a row that is wrong, and says what is wrong with it', () => {
    const soFar = reduceSoFar(notes([benchMark, ground, { label: 'b', backsightFt: 3 }]))
    expect(soFar.reduction?.points.map(({ elevationFt }) => elevationFt)).toEqual([100, 99])
    expect(soFar.sentence).toMatch(/^Row 3: /)
  })

  it('keeps the elevations above a figure that is no number', () => {
    const soFar = reduceSoFar(notes([benchMark, ground, { label: 'b', intermediateFt: '5,8' }]))
    expect(soFar.reduction?.points).toHaveLength(2)
  })

  it('does not hide the elevations behind a closing that is not complete', () => {
    const soFar = reduceSoFar(notes([benchMark, ground], { closing: { knownElevationFt: 100 } }))
    expect(soFar.reduction?.points).toHaveLength(2)
  })

  it('says nothing before the starting elevation is typed', () => {
    const typed = { ...notes([benchMark, ground]), startElevationFt: undefined }
    expect(reduceSoFar(typed)).toEqual({ reduction: null, groundLine: [], sentence: null })
  })
})
