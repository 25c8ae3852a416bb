import { describe, expect, it } from 'vitest'
import { EngineeringInputError } from './engineering-input-error.js'
import { requireNumber } from './require-number.js'

const caught = (run: () => unknown): EngineeringInputError => {
  try {
    run()
  } catch (error) {
    if (error instanceof EngineeringInputError) return error
    throw error
  }
  throw new Error('nothing was thrown')
}

describe('requireNumber', () => {
  it.each([NaN, Infinity, -Infinity, '18', '', null, undefined, {}, true])(
    'refuses %s by field name',
    (value) => {
      const error = caught(() => requireNumber({ field: 'widthFt', value, exclusiveMin: 0 }))
      expect(error.field).toBe('widthFt')
      expect(error.message).toMatch(/^widthFt is .*; it must be a number greater than 0\.$/)
    },
  )

  it('names the value and every limit that was set', () => {
    const error = caught(() => requireNumber({ field: 'percent', value: 120, min: 0, max: 100 }))
    expect(error.message).toBe('percent is 120; it must be a number at least 0 and at most 100.')
  })

  it.each([
    [{ min: 1 }, 1, true],
    [{ min: 1 }, 0.999, false],
    [{ exclusiveMin: 1 }, 1, false],
    [{ exclusiveMin: 1 }, 1.001, true],
    [{ max: 5 }, 5, true],
    [{ max: 5 }, 5.001, false],
    [{ exclusiveMax: 5 }, 5, false],
    [{ exclusiveMax: 5 }, 4.999, true],
    [{ integer: true }, 3, true],
    [{ integer: true }, 3.5, false],
  ])('holds the limit %o at %d', (limits, value, passes) => {
    const run = () => requireNumber({ field: 'x', value, ...limits })
    if (passes) expect(run()).toBe(value)
    else expect(run).toThrow(EngineeringInputError)
  })

  it('turns minus zero into zero', () => {
    expect(Object.is(requireNumber({ field: 'x', value: -0, min: 0 }), 0)).toBe(true)
  })
})
