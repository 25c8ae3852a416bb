import { describe, expect, it } from 'vitest'
import type { JobView, PacketView } from 'shared'
import { signingSteps } from './signing-steps'

const jobWith = (...reasons: string[]): JobView =>
  ({
    actions: [{ action: 'sign', words: 'Sign', enabled: reasons.length === 0, reasons }],
  }) as unknown as JobView

const packet = (change: Partial<PacketView> = {}): PacketView =>
  ({
    status: 'ready',
    iHaveConsented: false,
    pages: [1, 2, 3].map((number) => ({ number, title: `Page ${number}`, text: [] })),
    pagesReadByMe: [2],
    ...change,
  }) as PacketView

const ownSteps = ['You have not agreed to electronic records yet.', 'You have not opened every page yet.']

describe('steps before signing', () => {
  it('names the pages that are not read, in their order', () => {
    expect(signingSteps(jobWith(...ownSteps), packet()).unreadPages).toEqual([1, 3])
  })

  it('is the turn of somebody who only has to read and to agree', () => {
    expect(signingSteps(jobWith(...ownSteps), packet()).isMyTurn).toBe(true)
  })

  it('is not the turn of somebody who has signed, and keeps the reason', () => {
    const steps = signingSteps(jobWith('You have signed this revision already.'), packet())
    expect(steps).toMatchObject({
      isMyTurn: false,
      otherReasons: ['You have signed this revision already.'],
    })
  })

  it('is nobody’s turn while the packet is being made, or when the job offers no signature', () => {
    expect(signingSteps(jobWith(), packet({ status: 'making' })).isMyTurn).toBe(false)
    expect(signingSteps({ actions: [] } as unknown as JobView, packet()).isMyTurn).toBe(false)
  })
})
