import { z } from 'zod'

/** A whole number of cents as a decimal string of two places, such as "72.59". Never a float. */
export type Money = string & { readonly __money: unique symbol }

export const moneySchema = z
  .string()
  .regex(/^\d{1,12}\.\d{2}$/, 'Give dollars and cents, such as 72.59')
  .transform((text) => text as Money)

/** A rate in dollars per unit, up to four places, such as "1.8500". */
export const rateSchema = z
  .string()
  .regex(/^\d{1,10}(\.\d{1,4})?$/, 'Give a rate in dollars, up to four places, such as 1.85')

const firstYear = 1900
const lastYear = 2200

/** A civil date. It never passes through a Date object, so that no zone can move it. */
export const civilDateSchema = z.iso.date('Give a date as YYYY-MM-DD, such as 2026-05-14').refine((date) => {
  const year = Number(date.slice(0, 4))
  return year >= firstYear && year <= lastYear
}, `Give a year from ${firstYear} to ${lastYear}`)

export const instantSchema = z.iso.datetime({ offset: true })

export const idSchema = z.uuid('This is not an id of Wadestone')

export const sha256Schema = z.string().regex(/^[0-9a-f]{64}$/, 'A SHA-256 has 64 hexadecimal digits')

/**
 * Control characters, halves of characters (a database cannot store them), and the signs that make text read in
 * another order than it is stored.
 */
const hiddenSigns = /[\p{Cc}\p{Cs}\u202A-\u202E\u2066-\u2069]/u
const hiddenSignsMessage = 'Control characters are not allowed'
const isPlain = (text: string): boolean => !hiddenSigns.test(text)

const typedText = (max: number) =>
  z.string().trim().min(1, 'This must not be empty').max(max, `Use at most ${max} characters`)

/** One line of text a person types: trimmed, no control characters, so that it prints and mails safely. */
export const lineOfText = (max: number) => typedText(max).refine(isPlain, hiddenSignsMessage)

/** The same where nothing need be typed, such as words to look for. */
export const lineOrEmpty = (max: number) =>
  z.string().trim().max(max, `Use at most ${max} characters`).refine(isPlain, hiddenSignsMessage)

/** Several lines of text a person types. */
export const paragraph = (max: number) =>
  typedText(max)
    .overwrite((text) => text.replaceAll('\r\n', '\n'))
    .refine((text) => isPlain(text.replace(/[\t\n]/g, '')), hiddenSignsMessage)

/** A password: taken letter for letter, blanks and all. */
export const typedSecret = (minimum: number, whenShort: string) =>
  z
    .string()
    .min(minimum, whenShort)
    .max(256, 'Use at most 256 characters')
    .refine((text) => !/\p{Cs}/u.test(text), 'One of the characters is broken; type it again')

export const emailSchema = z
  .email('Give one e-mail address, such as name@example.org')
  .max(254, 'An e-mail address has at most 254 characters')
  .refine((text) => !/[\p{Cc}\p{Cs},;<>"]/u.test(text), 'Give one plain e-mail address')
  .transform((text) => text.toLowerCase())

/** A finite number within limits; the message names the range so that the form can show it. */
export const numberBetween = (minimum: number, maximum: number, unit: string) =>
  z
    .number(`Give a number from ${minimum} to ${maximum} ${unit}`.trim())
    .min(minimum, `Must be at least ${minimum} ${unit}`.trim())
    .max(maximum, `Must be at most ${maximum} ${unit}`.trim())

/** Far more than any farm is wide, and near enough to zero that a square foot still counts. */
const coordinateFt = numberBetween(-1e6, 1e6, 'ft')

/** A place on the map, feet from a point that the planner chose. */
export const planPointSchema = z.strictObject({ eastFt: coordinateFt, northFt: coordinateFt })
