import { describe, expect, it } from 'vitest'
import { z } from 'zod'
import {
  civilDateSchema,
  emailSchema,
  lineOfText,
  lineOrEmpty,
  numberBetween,
  paragraph,
  planPointSchema,
} from './primitives.js'

const sentence = (schema: z.ZodType, value: unknown) => schema.safeParse(value).error?.issues[0]?.message

describe('text that a person types', () => {
  it.each([
    ['half a character', 'pond \ud800'],
    ['the other half', '\udc00 pond'],
    ['a NUL', 'po\u0000nd'],
    ['a sign that turns the order of reading', 'po\u202End'],
  ])('is refused with %s in it, since it can neither be stored nor printed', (_, text) => {
    for (const schema of [lineOfText(40), lineOrEmpty(40), paragraph(40)]) {
      expect(sentence(schema, text)).toBe('Control characters are not allowed')
    }
    expect(emailSchema.safeParse(`${text}@example.org`).success).toBe(false)
  })

  it.each(['Añejo 6–9″ d½', 'whole pairs 🐄'])('is taken as it is: %s', (text) => {
    for (const schema of [lineOfText(40), lineOrEmpty(40), paragraph(40)])
      expect(schema.parse(text)).toBe(text)
  })

  it('may be empty only where nothing need be typed', () => {
    expect(lineOrEmpty(40).parse('  ')).toBe('')
    expect(sentence(lineOfText(40), '  ')).toBe('This must not be empty')
  })
})

describe('a civil date', () => {
  it.each(['1900-01-01', '2026-05-14', '2200-12-31'])('is taken: %s', (date) => {
    expect(civilDateSchema.parse(date)).toBe(date)
  })

  it.each([
    ['0000-01-01', 'Give a year from 1900 to 2200'],
    ['1899-12-31', 'Give a year from 1900 to 2200'],
    ['2201-01-01', 'Give a year from 1900 to 2200'],
    ['9999-12-31', 'Give a year from 1900 to 2200'],
    ['2026-02-30', 'Give a date as YYYY-MM-DD, such as 2026-05-14'],
    ['14.05.2026', 'Give a date as YYYY-MM-DD, such as 2026-05-14'],
  ])('%s is refused: %s', (date, message) => {
    expect(sentence(civilDateSchema, date)).toBe(message)
  })
})

describe('a number', () => {
  it.each([NaN, Infinity, -Infinity, '5', null])('is never %s', (value) => {
    expect(sentence(numberBetween(0, 10, 'ft'), value)).toBe('Give a number from 0 to 10 ft')
    expect(planPointSchema.safeParse({ eastFt: value, northFt: 0 }).success).toBe(false)
  })

  it.each([
    [-1e6, true],
    [1e6, true],
    [1e6 + 1, false],
    [-1e300, false],
  ])('of a place on the map, %d, is taken: %s', (northFt, isTaken) => {
    expect(planPointSchema.safeParse({ eastFt: 0, northFt }).success).toBe(isTaken)
  })
})
