import { describe, expect, it } from 'vitest'
import { fittingSizeMm, textWidthMm, wrapText } from './text-width.js'

const regular = { sizeMm: 4, weight: 'regular' as const }

describe('textWidthMm', () => {
  it('gives every figure the same width, so that columns of numbers stand straight', () => {
    const widths = [...'0123456789'].map((text) => textWidthMm({ text, ...regular }))
    expect(new Set(widths).size).toBe(1)
  })

  it('grows with the size and is the sum of its letters', () => {
    const word = textWidthMm({ text: 'ramp', ...regular })
    expect(textWidthMm({ text: 'ramp', ...regular, sizeMm: 8 })).toBeCloseTo(2 * word, 9)
    const letters = [...'ramp'].reduce((sum, text) => sum + textWidthMm({ text, ...regular }), 0)
    expect(word).toBeCloseTo(letters, 9)
  })
})

describe('wrapText', () => {
  it('never runs over its width, not even with a word longer than the line', () => {
    const text = 'Call the utility-locating service before digging Unbrokenwordlongerthananyline and wait'
    const lines = wrapText({ text, ...regular, widthMm: 22 })
    expect(lines.every((line) => textWidthMm({ text: line, ...regular }) <= 22)).toBe(true)
    expect(lines.join('').replaceAll(' ', '')).toBe(text.replaceAll(' ', ''))
  })

  it('never breaks at a hard space', () => {
    const lines = wrapText({ text: 'the grade is 8\u00a0:\u00a01 here', ...regular, widthMm: 16 })
    expect(lines.some((line) => line.includes('8\u00a0:\u00a01'))).toBe(true)
  })
})

describe('fittingSizeMm', () => {
  it('takes the largest size that fits, and the smallest when none does', () => {
    const sizesMm = [6, 5, 4]
    expect(fittingSizeMm({ text: 'toe', weight: 'bold', sizesMm, widthMm: 100 })).toBe(6)
    expect(fittingSizeMm({ text: 'toe of the ramp', weight: 'bold', sizesMm, widthMm: 1 })).toBe(4)
  })
})
