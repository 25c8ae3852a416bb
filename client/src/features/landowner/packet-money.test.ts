import { describe, expect, it } from 'vitest'
import { packetMoney } from './packet-money'

const pagesOf = (...text: string[]) => ({ pages: [{ number: 1, title: 'Signatures', text }] })

describe('packetMoney', () => {
  it('reads the three amounts of the signature page as they are printed', () => {
    const text = 'Estimated cost $7,248.50. All funds together $5,836.38. Left to the landowner $1,412.12.'
    expect(packetMoney(pagesOf('Job TF-2026-001.', text, 'I have read this packet.'))).toEqual({
      whole: '$7,248.50',
      funds: '$5,836.38',
      share: '$1,412.12',
    })
  })

  it('gives none of them when one is missing, rather than a part', () => {
    expect(packetMoney(pagesOf('Estimated cost $7,248.50. All funds together $5,836.38.'))).toBeNull()
  })
})
