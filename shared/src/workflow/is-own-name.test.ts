import { describe, expect, it } from 'vitest'
import { isOwnName } from './is-own-name.js'

describe('the typed name of a signer', () => {
  it.each([
    ['Odile Marchbank', 'Odile Marchbank'],
    ['odile m. MARCHBANK', 'Odile Marchbank'],
    ['Jose Nunez', 'José Núñez'],
    ['Marchbank, Odile', 'Odile Marchbank'],
  ])('%s is the name of %s', (typed, known) => expect(isOwnName(typed, known)).toBe(true))

  it.each([
    ['Wrong Name', 'Odile Marchbank'],
    ['X', 'Odile Marchbank'],
    ['O. M.', 'Odile Marchbank'],
    ['  ', 'Odile Marchbank'],
  ])('%s is not the name of %s', (typed, known) => expect(isOwnName(typed, known)).toBe(false))
})
