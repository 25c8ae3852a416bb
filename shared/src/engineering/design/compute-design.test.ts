import { describe, expect, it } from 'vitest'
import { workedGroundLine, workedInput, workedPlan } from '../../../test/worked-example.js'
import { computeDesign } from './compute-design.js'
import type { DesignInput } from './design-input.js'
import { designParts } from './design-parts.js'
import type { PartResult } from './part-result.js'
import { settingsCatalogue } from './settings-catalogue.js'

const ready = <Value>(part: PartResult<Value>): Value => {
  if (!part.ok) throw new Error(JSON.stringify(part))
  return part.value
}
const changed = (change: Partial<DesignInput>): DesignInput => ({ ...workedInput, ...change })

describe('computeDesign on one constructed pond ramp (no published source)', () => {
  const result = computeDesign(workedInput)

  it('takes off every line of the bill as it was worked out apart from this code', () => {
    const lines = ready(result.quantities).map(({ key, quantity }) => [key, quantity])
    expect(lines).toEqual([
      ['excavation-dry', 7.6566],
      // The end cut by hand, with the break of the bed at station 100: 37.924 ft³ over 13.2771 yd³ of ramp.
      ['excavation-wet', 14.6817],
      ['earth-fill', 4.4601],
      ['stone-surface', 34.077],
      ['stone-base', 29.9992],
      ['fabric', 191.6667],
      ['fabric-pad', 26.6667],
      ['fence-electric', 1184.9641],
      ['closing-panel', 114],
      ['gate', 1],
      ['energizer-and-grounding', 1],
      ['berm', 39.7505],
      ['seeding', 0.08187],
    ])
  })

  it('keeps what lies in the ground beside what is ordered', () => {
    const inPlace = Object.fromEntries(
      ready(result.quantities).map((line) => [line.key, line.inPlaceQuantity]),
    )
    expect(inPlace).toMatchObject({ 'stone-surface': 32.4543, 'stone-base': 28.5706, fabric: 157.0026 })
  })

  it('prices each line once and sums the lines shown', () => {
    const { lines, typical } = ready(result.cost)
    expect(lines.map((line) => line.typical)).toEqual([
      '34.45',
      '132.14',
      '22.30',
      '1056.39',
      '854.98',
      '354.58',
      '49.33',
      '2310.68',
      '855.00',
      '245.00',
      '390.00',
      '208.69',
      '50.76',
    ])
    // 6,564.45 apart from this code, with the end cut on a bed of one slope: 0.0173 yd³ more under water, 0.15 dollars.
    expect(typical).toBe('6564.30')
  })

  it('funds it by both sources and leaves the landowner nothing', () => {
    const { sources, landownerShare } = ready(result.funding)
    expect(sources.map(({ key, paid }) => [key, paid])).toEqual([
      ['A', '3949.97'],
      ['B', '2614.33'],
    ])
    expect(landownerShare).toBe('0.00')
  })

  it('reaches the verdicts that were reached apart from this code', () => {
    const verdicts = Object.fromEntries(result.checks.map(({ id, verdict }) => [id, verdict]))
    expect(verdicts).toMatchObject({
      grade: 'pass',
      'grade-preferred': 'pass',
      'width-for-herd': 'pass',
      frontage: 'pass',
      'rock-thickness-on-fabric': 'pass',
      'drawdown-served': 'pass',
      'reach-at-low-water': 'pass',
      'toe-not-in-pit': 'pass',
      'lap-wet': 'pass',
      setback: 'pass',
      'berm-velocity': 'pass',
      'berm-channel-grade': 'pass',
      'berm-clear-of-pad': 'pass',
      'top-and-flood-pool': 'caution',
    })
  })

  it('measures what the checks were measured at apart from this code', () => {
    const actual = (id: string) => result.checks.find((check) => check.id === id)?.actual
    expect(actual('toe-not-in-pit')).toBeCloseTo(0.132, 10)
    expect(actual('berm-velocity')).toBeCloseTo(1.39128, 5)
    expect(actual('berm-clear-of-pad')).toBeCloseTo(0.81336, 5)
    expect(actual('setback')).toBe(30)
  })

  it('fails the lane that stands energized inside the water at full pool', () => {
    expect(result.checks.find(({ id }) => id === 'fence-in-flood')?.verdict).toBe('fail')
  })
})

describe('computeDesign', () => {
  it('gives the same result for the same input and leaves the input as it was', () => {
    const before = structuredClone(workedInput)
    expect(computeDesign(workedInput)).toEqual(computeDesign(workedInput))
    expect(workedInput).toEqual(before)
  })

  it('gives a result that reads the same after it was stored', () => {
    const result = computeDesign(workedInput)
    // JSON turns what is no number into null, so this also says that no figure is NaN or endless.
    expect(JSON.parse(JSON.stringify(result))).toEqual(result)
  })

  it('keeps all other parts when the berm is half typed', () => {
    const berm = { ...workedPlan.berm, channelGradeFtPerFt: 0 } as DesignInput['berm']
    const result = computeDesign(changed({ berm }))
    expect(result.berm).toMatchObject({ ok: false, field: 'berm.channelGradeFtPerFt' })
    expect(result.quantities).toEqual({ ok: false, waitingFor: expect.arrayContaining(['berm']) })
    expect(result.cost).toEqual({ ok: false, waitingFor: ['quantities'] })
    expect(result.funding).toEqual({ ok: false, waitingFor: ['cost'] })
    for (const part of ['profile', 'earthwork', 'rock', 'fabric', 'fence', 'runoff'] as const) {
      expect(result[part].ok).toBe(true)
    }
  })

  it('keeps the sections while the pad is half typed, and the bill waits for the pad', () => {
    const approach = { ...workedPlan.pads?.approach, thicknessIn: 0 }
    const result = computeDesign(changed({ pads: { approach } as DesignInput['pads'] }))
    expect(result.approachPad).toMatchObject({ ok: false, field: 'pads.approach.thicknessIn' })
    expect(result.earthwork.ok).toBe(true)
    expect(result.quantities).toEqual({ ok: false, waitingFor: ['approachPad'] })
  })

  it('says of an empty design what to enter first, part by part', () => {
    const { inputVersion, costList, sources, criteria, settings } = workedInput
    const result = computeDesign({ inputVersion, costList, sources, criteria, settings })
    expect(result.herd).toMatchObject({ ok: false, field: 'herd' })
    expect(result.profile).toMatchObject({ ok: false, field: 'site' })
    expect(result.working).toEqual([])
    expect(result.checks.every(({ verdict }) => verdict === 'not-applicable')).toBe(true)
  })

  it('asks for the survey before it lays out the ramp', () => {
    const site = workedPlan.site && { ...workedPlan.site, groundLine: [] }
    expect(computeDesign(changed({ site })).profile).toEqual({
      ok: false,
      field: 'site.groundLine',
      message: 'There is no survey yet. Enter level notes or a ground line first.',
    })
  })

  it.each(settingsCatalogue.filter(({ isNeeded }) => isNeeded))(
    'names the needed setting $key while it is empty, and who can fill it in',
    ({ key, label }) => {
      const empty = workedInput.settings.map((setting) =>
        setting.key === key ? { ...setting, value: null } : setting,
      )
      for (const settings of [empty, empty.filter((setting) => setting.key !== key)]) {
        const result = computeDesign(changed({ settings }))
        const message = `The district setting "${label}" is still empty. An administrator can fill it in under Settings.`
        const failed = designParts.map((part) => result[part]).filter((part) => 'message' in part)
        expect(failed).toContainEqual({ ok: false, field: `settings.${key}`, message })
        expect(result.cost.ok).toBe(false)
      }
    },
  )

  it('needs no setting that the catalogue does not call needed', () => {
    const needed = new Set<string>(settingsCatalogue.flatMap(({ key, isNeeded }) => (isNeeded ? [key] : [])))
    const result = computeDesign(
      changed({ settings: workedInput.settings.filter(({ key }) => needed.has(key)) }),
    )
    for (const part of designParts) expect(result[part].ok, part).toBe(true)
    expect(result.funding.ok).toBe(true)
  })

  it('names the field of the site when the survey is too short', () => {
    const site = workedPlan.site && { ...workedPlan.site, groundLine: workedGroundLine.slice(0, 9) }
    expect(computeDesign(changed({ site })).profile).toMatchObject({ ok: false, field: 'site.groundLine' })
  })

  it('says when no cost list is in force, or it lacks a line', () => {
    expect(computeDesign(changed({ costList: null })).cost).toMatchObject({ ok: false, field: 'costList' })
    const costList = { name: 'Short', lines: workedInput.costList?.lines.slice(1) ?? [] }
    expect(computeDesign(changed({ costList })).cost).toMatchObject({
      ok: false,
      field: 'costList.excavation-dry',
    })
  })

  it('leaves the whole cost to the landowner when no fund is chosen', () => {
    const funding = ready(computeDesign(changed({ sources: [] })).funding)
    expect(funding).toMatchObject({ totalPaid: '0.00', landownerShare: '6564.30' })
  })

  it('does without pad, panel and pond where the job has none', () => {
    const result = computeDesign(changed({ pads: {}, closingPanel: undefined, pond: undefined }))
    expect([result.approachPad, result.closingPanel, result.pond]).toEqual([
      { ok: true, value: null },
      { ok: true, value: null },
      { ok: true, value: null },
    ])
    const keys = ready(result.quantities).map(({ key }) => key)
    expect(keys).not.toContain('fabric-pad')
    // The closing run of the fence still closes the ramp off.
    expect(keys).toContain('closing-panel')
  })

  it('shows the working of every figure with numbers only', () => {
    const { working } = computeDesign(workedInput)
    expect(new Set(working.map(({ key }) => key)).size).toBe(working.length)
    for (const { result, numbers, formula, source } of working) {
      expect([result, ...numbers.map(({ value }) => value)].every(Number.isFinite)).toBe(true)
      expect(formula.length * source.length).toBeGreaterThan(0)
    }
  })
})
