import { describe, expect, it } from 'vitest'
import { fenceEnergizer, type FenceEnergizerInput } from './fence-energizer.js'

const refusal = (field: string) => expect.objectContaining({ name: 'EngineeringInputError', field })

const sixMiles: FenceEnergizerInput = {
  fenceFt: 6 * 5280,
  hotWireFt: 4 * 6 * 5280,
  energizerRule: { basis: 'fence-mile', joulesPerMile: 1 },
  groundRodRule: { rodFtPerJoule: 3, rodLengthFt: 6, minimumRods: 1 },
}

describe('fenceEnergizer', () => {
  it('6 miles take 6 joules and 18 ft of rod, three of 6 ft (Gerrish, Common Fencing Mistakes, Beef Magazine)', () => {
    expect(fenceEnergizer(sixMiles)).toMatchObject({
      neededJoules: 6,
      rodFtByRule: 18,
      rods: 3,
      rodsGovernedBy: 'length per joule',
    })
  })

  it('one mile with four hot wires counts four miles (University of Maine Extension, Electric Fence Design)', () => {
    const rule = { basis: 'hot-wire-mile', joulesPerMile: 1 } as const
    const mile = { ...sixMiles, fenceFt: 5280, hotWireFt: 4 * 5280, energizerRule: rule }
    expect(fenceEnergizer(mile).neededJoules).toBe(4)
  })

  it('15 joules take 45 ft of rod (published trade table, 3 ft of rod per joule)', () => {
    const big = { ...sixMiles, fenceFt: 15 * 5280 }
    expect(fenceEnergizer(big).rodFtByRule).toBeCloseTo(45, 9)
  })

  it('5 joules take three 8-ft rods by the least number (Cloverland Electric, utility advice)', () => {
    const groundRodRule = { rodFtPerJoule: 3, rodLengthFt: 8, minimumRods: 3 }
    const five = fenceEnergizer({ ...sixMiles, fenceFt: 5 * 5280, groundRodRule })
    expect(five).toMatchObject({ rodsByRule: 2, rods: 3, rodFt: 24, rodsGovernedBy: 'minimum number' })
  })

  it('counts fence that is already on the energizer', () => {
    expect(fenceEnergizer({ ...sixMiles, existingEnergizedMiles: 2.5 }).neededJoules).toBeCloseTo(8.5, 12)
  })

  it('takes the next size up of the list, and grounds that size', () => {
    const energizerRule = { basis: 'fence-mile', joulesPerMile: 1, sizesJoules: [2, 6, 12] } as const
    expect(fenceEnergizer({ ...sixMiles, energizerRule }).sizeJoules).toBe(6)
    const more = fenceEnergizer({ ...sixMiles, energizerRule, existingEnergizedMiles: 0.1 })
    expect(more).toMatchObject({ sizeJoules: 12, rodFtByRule: 36, rods: 6 })
  })

  it('says when no size of the list is large enough', () => {
    const energizerRule = { basis: 'fence-mile', joulesPerMile: 1, sizesJoules: [2] } as const
    const short = fenceEnergizer({ ...sixMiles, energizerRule })
    expect(short).not.toHaveProperty('sizeJoules')
    expect(short.notes).toHaveLength(1)
    expect(short.rods).toBe(3)
  })

  it.each<[string, Partial<FenceEnergizerInput>]>([
    ['existingEnergizedMiles', { existingEnergizedMiles: -1 }],
    ['energizerRule.joulesPerMile', { energizerRule: { basis: 'fence-mile', joulesPerMile: 0 } }],
    [
      'energizerRule.sizesJoules[1]',
      { energizerRule: { basis: 'fence-mile', joulesPerMile: 1, sizesJoules: [3, 2] } },
    ],
    [
      'groundRodRule.rodFtPerJoule',
      { groundRodRule: { rodFtPerJoule: NaN, rodLengthFt: 6, minimumRods: 1 } },
    ],
    ['groundRodRule.rodLengthFt', { groundRodRule: { rodFtPerJoule: 3, rodLengthFt: 0, minimumRods: 1 } }],
    ['groundRodRule.minimumRods', { groundRodRule: { rodFtPerJoule: 3, rodLengthFt: 6, minimumRods: 1.5 } }],
  ])('refuses a bad %s by name', (field, change) => {
    expect(() => fenceEnergizer({ ...sixMiles, ...change })).toThrow(refusal(field))
  })
})
