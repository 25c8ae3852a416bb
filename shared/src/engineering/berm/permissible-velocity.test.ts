import { describe, expect, it } from 'vitest'
import { permissibleVelocity } from './permissible-velocity.js'

const refusal = (field: string) => expect.objectContaining({ name: 'EngineeringInputError', field })

describe('permissibleVelocity', () => {
  it.each([
    ['sand-silt-loam', 'bare', 1.5],
    ['sand-silt-loam', 'good', 3],
    ['clay-loam', 'poor', 2.5],
    ['clay', 'good', 5],
  ] as const)(
    'along a berm on %s under %s cover is %d ft/s (Minnesota Stormwater Manual)',
    (soil, cover, limit) => {
      expect(permissibleVelocity({ table: 'berm', soil, cover }).limitFtPerS).toBe(limit)
    },
  )

  it.each([
    ['bermudagrass', 0.05, 8, 6],
    ['bermudagrass', 0.051, 7, 5],
    ['sod-grass', 0.07, 6, 4],
    ['sod-grass', 0.2, 5, 3],
    ['grass-mixture', 0.1, 4, 3],
    ['annual', 0.01, 3.5, 2.5],
  ] as const)('on %s at grade %d is %d and %d ft/s (SCS-TP-61, revised 1954)', (cover, grade, firm, weak) => {
    const at = { table: 'sod', cover, channelGradeFtPerFt: grade } as const
    expect(permissibleVelocity({ ...at, soil: 'erosion-resistant' }).limitFtPerS).toBe(firm)
    expect(permissibleVelocity({ ...at, soil: 'easily-eroded' }).limitFtPerS).toBe(weak)
  })

  it('gives no limit where the table does not allow the cover on that grade, but names the table', () => {
    const answer = permissibleVelocity({
      table: 'sod',
      cover: 'annual',
      soil: 'easily-eroded',
      channelGradeFtPerFt: 0.06,
    })
    expect(answer.limitFtPerS).toBeUndefined()
    expect(answer.source).toContain('SCS-TP-61')
  })

  it.each([
    ['soil', { table: 'berm', soil: 'peat', cover: 'good' }],
    ['cover', { table: 'berm', soil: 'clay', cover: 'trees' }],
    ['cover', { table: 'sod', soil: 'easily-eroded', cover: 'moss', channelGradeFtPerFt: 0.01 }],
    ['soil', { table: 'sod', soil: 'peat', cover: 'annual', channelGradeFtPerFt: 0.01 }],
    ['channelGradeFtPerFt', { table: 'sod', soil: 'easily-eroded', cover: 'annual', channelGradeFtPerFt: 0 }],
  ])('refuses a bad %s by name', (field, input) => {
    expect(() => permissibleVelocity(input as never)).toThrow(refusal(field))
  })
})
