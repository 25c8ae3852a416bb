import { moneyText, type FundedSource } from 'shared'

const percentOfWords = {
  'estimated-cost': 'of the estimated cost',
  'cost-after-earlier-sources': 'of the cost left after the funds before it',
} as const

/** How a fund pays, in the words of the packet. */
export function howItPays({ kind, percentOf, base }: FundedSource): string {
  if (kind === 'unit-rate') return 'A rate for each unit'
  if (kind === 'fixed') return 'A fixed amount'
  const of = percentOfWords[percentOf ?? 'estimated-cost']
  return `A percent ${of}${base ? `, taken of ${moneyText(base)}` : ''}`
}
