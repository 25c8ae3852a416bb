import { Decimal } from 'decimal.js'

/**
 * Decimal arithmetic of our own, so that nobody else's settings reach it. 40 digits hold every product of an
 * amount, a rate and a percent without a rounding of its own.
 */
export const Exact = Decimal.clone({
  precision: 40,
  rounding: Decimal.ROUND_HALF_UP,
  toExpNeg: -60,
  toExpPos: 60,
})

export type ExactNumber = Decimal

export const exactSum = (values: readonly ExactNumber[]): ExactNumber =>
  values.reduce((sum, value) => sum.plus(value), new Exact(0))
