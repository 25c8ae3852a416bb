import { describe, expect, it } from 'vitest'
import { pointColumns } from './grid-columns'
import { readRows } from './grid-rows'
import { isBlock, pasteBlock } from './paste-block'

describe('a pasted block', () => {
  it('is one only when it holds more than one cell, so that a single figure pastes as text', () => {
    expect(isBlock('5.84')).toBe(false)
    expect(isBlock('5.84\r\n')).toBe(false)
    expect(isBlock('5.84\t6')).toBe(true)
    expect(isBlock('5.84\n6')).toBe(true)
  })

  it('leaves cells outside it alone and drops what lies right of the last column', () => {
    const rows = [
      { stationFt: '0', elevationFt: '100', waterDepthFt: '' },
      { stationFt: '9', elevationFt: '', waterDepthFt: '2' },
    ]
    const pasted = pasteBlock({ columns: pointColumns, rows, at: { row: 0, column: 1 }, text: '99\t\tx\n98' })
    expect(pasted).toEqual([
      { stationFt: '0', elevationFt: '99', waterDepthFt: '' },
      { stationFt: '9', elevationFt: '98', waterDepthFt: '2' },
    ])
  })
})

describe('rows as they are sent', () => {
  it('leave blank rows at the end out, and keep the number of every row before', () => {
    const blank = { stationFt: ' ', elevationFt: '', waterDepthFt: '' }
    const rows = [
      { stationFt: '0+20', elevationFt: '99.5 ft', waterDepthFt: '' },
      blank,
      { ...blank, stationFt: '30' },
      blank,
    ]
    expect(readRows(pointColumns, rows)).toEqual([
      { stationFt: 20, elevationFt: 99.5 },
      {},
      { stationFt: 30 },
    ])
  })
})
