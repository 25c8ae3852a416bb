import { actRequest } from './act-request.js'

describe('what the guards see of an act', () => {
  it('counts the notes of a return', () => {
    expect(actRequest({ action: 'return', notes: ['Move the gate.', 'Date the map.'] })).toMatchObject({
      notes: 2,
    })
  })

  it('keeps the hash that a signer read', () => {
    const act = { action: 'sign', typedName: 'Ada Fen', intends: true, packetSha256: 'a'.repeat(64) } as const
    expect(actRequest(act)).toMatchObject({ packetSha256: 'a'.repeat(64) })
  })
})
