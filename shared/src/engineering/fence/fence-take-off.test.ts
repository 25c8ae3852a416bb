import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { FenceRun, FenceTakeOffInput } from './fence-input.js'
import { fenceTakeOff } from './fence-take-off.js'
import { at, pondJob, straightRun, withRuns } from './fence-take-off.fixture.js'

const refusal = (field: string) => expect.objectContaining({ name: 'EngineeringInputError', field })

describe('fenceTakeOff of the pond job (constructed example, no outside evidence)', () => {
  const result = fenceTakeOff(pondJob)

  it('splits the exclusion run at its gate and eight corners and counts 39 line posts', () => {
    const [exclusion] = result.runs
    expect(exclusion?.lengthFt).toBeCloseTo(1124.2640687119285, 9)
    expect(exclusion?.fencedLengthFt).toBeCloseTo(1110.2640687119285, 9)
    const pulls = [40.5, 40.5, 106.066, 150, 106.066, 210, 106.066, 150, 106.066, 95]
    expect(exclusion?.pullsFt.map((pull) => Number(pull.toFixed(3)))).toEqual(pulls)
    expect(exclusion?.deflectionsDeg.map((turn) => Number(turn.toFixed(6)))).toEqual(Array(8).fill(45))
    expect(exclusion).toMatchObject({
      corners: 8,
      gates: 1,
      linePosts: 39,
      inLineBraces: 0,
      lineInsulators: 78,
    })
  })

  it('counts 39, 1, 1 and 9 line posts over the runs', () => {
    expect(result.runs.map(({ linePosts }) => linePosts)).toEqual([39, 1, 1, 9])
    expect(result.posts).toEqual({ line: 50, corner: 12, tee: 0, end: 0, gate: 2, through: 2 })
  })

  it('joins eight ends in four places: two corners on land, two straight posts at the panel', () => {
    expect(result.nodes.map(({ kind }) => kind)).toEqual(['corner', 'corner', 'through', 'through'])
    expect(result.nodes.map(({ braces }) => braces)).toEqual([2, 2, 0, 0])
  })

  it('braces corners with 16 + 4 + 4, the gate with 2, and nothing in line', () => {
    expect(result.braces).toEqual({ corner: 24, tee: 0, end: 0, gate: 2, inLine: 0, total: 26 })
  })

  it('orders 3,732.64 ft of high-tensile and 359.10 ft of barbless, one roll each', () => {
    expect(result.wire).toEqual([
      expect.objectContaining({
        kind: 'high-tensile',
        orderFt: expect.closeTo(3732.6368164425758, 8),
        rolls: 1,
      }),
      expect.objectContaining({ kind: 'barbless', orderFt: expect.closeTo(359.1, 8), rolls: 1 }),
    ])
    expect(result.runs.map(({ wireFt }) => wireFt)).toEqual([
      expect.closeTo(3330.792206135786, 8),
      expect.closeTo(112.05, 8),
      expect.closeTo(112.05, 8),
      expect.closeTo(342, 8),
    ])
    expect(result.runs[0]?.hotWireFt).toBeCloseTo(2220.528137423857, 8)
    expect(result.runs[3]?.hotWireFt).toBe(0)
  })

  it('needs 0.2244 joule and three rods by the least number', () => {
    expect(result.energizer).toMatchObject({
      fenceMiles: expect.closeTo(0.22442501301362283, 10),
      hotWireMiles: expect.closeTo(0.44885002602724566, 10),
      neededJoules: expect.closeTo(0.22442501301362283, 10),
      rodFtByRule: expect.closeTo(0.6732750390408685, 10),
      rodsByRule: 1,
      rods: 3,
      rodFt: 24,
      rodsGovernedBy: 'minimum number',
    })
  })

  it('stands 30 ft from the water and sets 31,350 ft² aside', () => {
    expect(result).toMatchObject({
      setbackFt: 30,
      enclosedAreaFt2: 96750,
      waterAreaFt2: 64800,
      habitatAreaFt2: 31350,
    })
  })
})

describe('fenceTakeOff counts', () => {
  it('10 sections and 9 line posts on 75 ft at 8 ft (Hoover Fence, fence quantities)', () => {
    const result = fenceTakeOff(withRuns([{ ...straightRun, path: { lengthFt: 75 }, postSpacingFt: 8 }]))
    expect(result.posts.line).toBe(9)
  })

  it.each([
    [4, 16],
    [5, 20],
  ])(
    '%d barbed wires over a mile take %d rolls of 1,320 ft (HPPR, Building Fence Facts, 2016)',
    (wires, rolls) => {
      const run = { ...straightRun, path: { lengthFt: 5280 }, wires }
      expect(fenceTakeOff({ ...withRuns([run]), wastePercent: 0 }).wire[0]?.rolls).toBe(rolls)
    },
  )

  it('adds 5 % to 300 of wire and orders 315 (The Scottish Farmer, Getting Your Fencing Needs Right)', () => {
    const run = { ...straightRun, path: { lengthFt: 300 }, wires: 1 }
    expect(fenceTakeOff(withRuns([run])).wire[0]?.orderFt).toBeCloseTo(315, 10)
  })

  it('exact multiples of the spacing take no extra post', () => {
    expect(fenceTakeOff(withRuns([{ ...straightRun, path: { lengthFt: 100 } }])).posts.line).toBe(3)
  })

  it('has one brace at each free end', () => {
    const { posts, braces } = fenceTakeOff(withRuns([straightRun]))
    expect(posts.end).toBe(2)
    expect(braces).toMatchObject({ end: 2, total: 2 })
  })

  it('puts in-line braces where a pull is longer than the longest pull', () => {
    const long = (lengthFt: number) =>
      fenceTakeOff(withRuns([{ ...straightRun, path: { lengthFt } }])).braces.inLine
    expect([660, 661, 1320, 1321].map(long)).toEqual([0, 1, 1, 2])
  })

  it('carries a pull on through a straight post between like runs, with its braces and tie-offs', () => {
    const first = { ...straightRun, path: { points: [at(0, 0), at(500, 0)] } }
    const second = { ...straightRun, name: 'b', path: { points: [at(500.3, 0), at(1000, 10)] } }
    const result = fenceTakeOff({ ...withRuns([first, second]), tieOffFt: 2 })
    expect(result.nodes.map(({ kind }) => kind)).toEqual(['end', 'through', 'end'])
    expect(result.runs.map(({ inLineBraces }) => inLineBraces)).toEqual([1, 0])
    expect(result.braces).toMatchObject({ end: 2, inLine: 1, total: 3 })
    expect(result.wire[0]?.tieOffFt).toBe(2 * 4 * 2)
    expect(result.posts.through).toBe(1)
  })

  it('ties unlike runs off at their straight post and says so', () => {
    const first = { ...straightRun, path: { points: [at(0, 0), at(500, 0)] } }
    const second = { ...straightRun, name: 'b', wires: 5, path: { points: [at(500, 0), at(1000, 0)] } }
    const result = fenceTakeOff({ ...withRuns([first, second]), tieOffFt: 2 })
    expect(result.nodes[1]).toMatchObject({ kind: 'through', braces: 0, changesFence: true })
    expect(result.wire[0]?.tieOffFt).toBe(2 * 4 * 2 + 2 * 5 * 2)
    expect(result.braces.inLine).toBe(0)
    expect(result.notes.join()).toContain('tied off')
  })

  it('braces a corner twice and a tee three times, on one post', () => {
    const bar = { ...straightRun, path: { points: [at(0, 0), at(100, 0)] } }
    const right = { ...straightRun, name: 'right', path: { points: [at(100, 0), at(200, 0)] } }
    const stem = { ...straightRun, name: 'stem', path: { points: [at(100, 0), at(100, 80)] } }
    expect(fenceTakeOff(withRuns([bar, stem])).braces).toMatchObject({ corner: 2, end: 2 })
    const tee = fenceTakeOff(withRuns([bar, right, stem]))
    expect(tee.braces).toMatchObject({ tee: 3, end: 3, total: 6 })
    expect(tee.posts).toMatchObject({ tee: 1, end: 3 })
  })

  it('joins measured runs by the labels of their ends, as a corner', () => {
    const first = { ...straightRun, path: { lengthFt: 100, endsAt: 'gate post' } }
    const second = { ...straightRun, name: 'b', path: { lengthFt: 60, startsAt: 'gate post' } }
    const result = fenceTakeOff(withRuns([first, second]))
    expect(result.nodes.map(({ kind }) => kind)).toEqual(['end', 'corner', 'end'])
    expect(result.nodes[1]?.label).toBe('gate post')
  })

  it('takes no new post and brace at a post that stands already', () => {
    const run = { ...straightRun, path: { lengthFt: 100, endsAt: 'barn' } }
    const result = fenceTakeOff({ ...withRuns([run]), nodes: [{ label: 'barn', existing: true }] })
    expect(result.braces.total).toBe(1)
    expect(result.posts.end).toBe(1)
    expect(() => fenceTakeOff({ ...withRuns([run]), nodes: [{ label: 'bran', existing: true }] })).toThrow(
      refusal('nodes[0].label'),
    )
  })

  it('takes netting for woven fence beside its single wires', () => {
    const run: FenceRun = { ...straightRun, fence: 'woven', wires: 1, path: { lengthFt: 660 } }
    const result = fenceTakeOff({
      ...withRuns([run]),
      rollLengthFt: { barbed: 1320, netting: 330 },
      wastePercent: 0,
    })
    expect(result.wire.map(({ kind, netFt, rolls }) => [kind, netFt, rolls])).toEqual([
      ['barbed', 660, 1],
      ['netting', 660, 2],
    ])
    expect(() => fenceTakeOff(withRuns([run]))).toThrow(refusal('rollLengthFt.netting'))
  })

  it('insulates hot wires only, corners and gate posts apart from line posts', () => {
    const run: FenceRun = {
      ...straightRun,
      fence: 'electric',
      energized: true,
      wires: 5,
      hotWires: 3,
      path: { points: [at(0, 0), at(100, 0), at(100, 100)] },
      gates: [{ widthFt: 12 }],
    }
    const result = fenceTakeOff(withRuns([run]))
    expect(result.insulators.line).toBe(3 * result.posts.line)
    expect(result.insulators.strain).toBe(3 * (1 + 2 + 2))
  })

  it('has the sum of the same runs apart where they do not touch', () => {
    const length = fc.double({ min: 1, max: 3000, noNaN: true })
    fc.assert(
      fc.property(length, length, (a, b) => {
        const first = { ...straightRun, path: { lengthFt: a } }
        const second = { ...straightRun, name: 'b', path: { lengthFt: b } }
        const both = fenceTakeOff(withRuns([first, second]))
        const [one, two] = [fenceTakeOff(withRuns([first])), fenceTakeOff(withRuns([second]))]
        expect(both.posts.line).toBe(one.posts.line + two.posts.line)
        expect(both.braces.total).toBe(one.braces.total + two.braces.total)
        expect(both.wire[0]?.orderFt).toBeCloseTo(
          (one.wire[0]?.orderFt ?? 0) + (two.wire[0]?.orderFt ?? 0),
          6,
        )
      }),
    )
  })
})

describe('fenceTakeOff gates', () => {
  const gated = (gates: FenceRun['gates'], lengthFt = 400) =>
    fenceTakeOff(withRuns([{ ...straightRun, path: { lengthFt }, gates }]))

  it('takes the opening from the pull, with two posts and two braces', () => {
    const result = gated([{ widthFt: 16 }])
    expect(result.runs[0]?.pullsFt).toEqual([192, 192])
    expect(result.posts.gate).toBe(2)
    expect(result.braces.gate).toBe(2)
    expect(result.gates).toEqual({ count: 1, totalWidthFt: 16 })
    expect(result.fencedLengthFt).toBe(384)
  })

  it('stands where it is put, and gates without a place keep clear of it', () => {
    const result = gated([{ widthFt: 10 }, { widthFt: 20, atFt: 50 }])
    expect(result.runs[0]?.pullsFt).toEqual([15, 15, 340].map((pull) => expect.closeTo(pull, 9)))
  })

  it('refuses a gate that does not fit, by name', () => {
    expect(() => gated([{ widthFt: 16 }], 16)).toThrow(refusal('runs[0].gates[0].widthFt'))
    expect(() => gated([{ widthFt: 16, atFt: 5 }])).toThrow(refusal('runs[0].gates[0].atFt'))
    expect(() => gated([{ widthFt: NaN }])).toThrow(refusal('runs[0].gates[0].widthFt'))
  })
})

describe('fenceTakeOff with bad input', () => {
  const run = (change: Partial<FenceRun>) => ({ ...withRuns([{ ...straightRun, ...change }]) })
  const electric = { fence: 'electric', energized: true } as const

  it('refuses an energized run in the water and gives the reason', () => {
    expect(() => fenceTakeOff(run({ ...electric, inWater: true }))).toThrow(refusal('runs[0].energized'))
    expect(() => fenceTakeOff(run({ ...electric, inWater: true }))).toThrow(/district safety rule/)
  })

  it.each<[string, FenceTakeOffInput]>([
    ['runs', withRuns([])],
    ['runs[0].path.lengthFt', run({ path: { lengthFt: 0 } })],
    ['runs[0].path.lengthFt', run({ path: { lengthFt: NaN } })],
    ['runs[0].path.points', run({ path: { points: [at(1, 1), at(1, 1)] } })],
    ['runs[0].path.points[1].northFt', run({ path: { points: [at(1, 1), at(1, Infinity)] } })],
    ['runs[0].wires', run({ wires: 0 })],
    ['runs[0].wires', run({ wires: 2.5 })],
    ['runs[0].hotWires', run({ hotWires: 1 })],
    ['runs[0].hotWires', run({ ...electric, hotWires: 5 })],
    ['runs[0].postSpacingFt', run({ postSpacingFt: -0 })],
    ['runs[0].fence', run({ fence: 'hedge' as never })],
    ['runs[0].role', run({ role: 'garden' as never })],
    ['rollLengthFt.wool', run({ wireKind: 'wool' })],
    ['rollLengthFt.toString', run({ wireKind: 'toString' })],
    ['cornerAngleDeg', { ...withRuns([straightRun]), cornerAngleDeg: -1 }],
    ['maxPullFt', { ...withRuns([straightRun]), maxPullFt: 0 }],
    ['tieOffFt', { ...withRuns([straightRun]), tieOffFt: -1 }],
    ['wastePercent', { ...withRuns([straightRun]), wastePercent: NaN }],
    ['laneAreaFt2', { ...pondJob, laneAreaFt2: -1 }],
    ['waterOutline[0].eastFt', { ...pondJob, waterOutline: [at(NaN, 0), at(1, 0), at(0, 1)] }],
  ])('refuses a bad %s by name', (field, input) => {
    expect(() => fenceTakeOff(input)).toThrow(refusal(field))
  })
})
