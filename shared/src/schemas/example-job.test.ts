import { describe, expect, it } from 'vitest'
import { exampleDesign, readExample } from '../../examples/example-design.js'
import { designParts } from '../engineering/design/design-parts.js'
import { quantityKeys } from '../engineering/design/quantity-catalogue.js'
import { settingsCatalogue } from '../engineering/design/settings-catalogue.js'
import type { PartResult } from '../engineering/design/part-result.js'
import type { DesignPlan } from './design-plan.js'
import { designPlanSchema } from './design-plan.js'

const ready = <Value>(part: PartResult<Value>): Value => {
  if (!part.ok) throw new Error(JSON.stringify(part))
  return part.value
}

interface Change {
  path: string
  value: unknown
}

/** The plan with what a reader asked for. Every path must lead to a value that is there, or the tour would stop. */
function withChanges(plan: DesignPlan, changes: readonly Change[]): DesignPlan {
  const changed: unknown = structuredClone(plan)
  for (const { path, value } of changes) {
    const keys = path.split('/').slice(1)
    const last = keys.pop() ?? ''
    const holder = keys.reduce<unknown>((node, key) => (node as { [key: string]: unknown })[key], changed)
    if (typeof holder !== 'object' || holder === null || !(last in holder))
      throw new Error(`nothing at ${path}`)
    Reflect.set(holder, last, value)
  }
  return designPlanSchema.parse(changed)
}

const names = ['north-pond', 'lower-tank'] as const

describe.each(names)('the example job %s', (name) => {
  const read = readExample(name)
  const { example, notes } = read
  const result = exampleDesign(read)

  it('has level notes that check and close', () => {
    expect([notes.arithmeticCheckPasses, notes.closes]).toEqual([true, true])
  })

  it('is worked out in every part', () => {
    const unready = [...designParts, 'quantities', 'cost', 'funding'].filter(
      (part) => !(result[part as keyof typeof result] as PartResult<unknown>).ok,
    )
    expect(unready).toEqual([])
  })

  it('fails no published criterion', () => {
    expect(result.checks.filter(({ verdict }) => verdict === 'fail')).toEqual([])
    expect(result.checks.some(({ verdict }) => verdict === 'pass')).toBe(true)
  })

  it('costs more than its funds pay, and they pay something', () => {
    const { typical, low, high } = ready(result.cost)
    const { totalPaid, sources } = ready(result.funding)
    expect(Number(totalPaid)).toBeLessThan(Number(typical))
    for (const { paid } of sources) expect(Number(paid)).toBeGreaterThan(0)
    expect(Number(low)).toBeLessThan(Number(typical))
    expect(Number(typical)).toBeLessThan(Number(high))
  })

  it('still fails nothing after what landowner and supervisor ask for, and each of it changes the design', () => {
    const afterLandowner = withChanges(example.plan, example.landownerAsks.change)
    const afterSupervisor = withChanges(afterLandowner, example.supervisorAsks.change)
    const [second, third] = [afterLandowner, afterSupervisor].map((plan) => exampleDesign({ ...read, plan }))
    for (const changed of [second, third]) {
      expect(changed?.checks.filter(({ verdict }) => verdict === 'fail')).toEqual([])
      expect(changed?.funding.ok).toBe(true)
    }
    expect(second?.quantities).not.toEqual(result.quantities)
    expect(third?.quantities).not.toEqual(second?.quantities)
  })

  it('draws its closing panel as long as the panel is reckoned, from the edge of the water at full pool', () => {
    const panel = ready(result.closingPanel)
    const run = ready(result.fence).runs.find(
      (_, index) => example.plan.fence?.runs[index]?.role === 'closing',
    )
    const { side, end } = panel?.pullsFt ?? { side: NaN, end: NaN }
    expect(run?.pullsFt).toEqual([side, end, side].map((pull) => expect.closeTo(pull, 6)))
    expect(run?.lengthFt).toBeCloseTo(panel?.lengthFt ?? NaN, 6)
  })

  it('prices every line of its bill and maps its schedules to lines that exist', () => {
    const priced = new Set(example.costList.lines.map(({ key }) => key))
    for (const { key } of ready(result.quantities)) expect(priced).toContain(key)
    for (const { quantityKey } of example.schedules.flatMap(({ lines }) => lines)) {
      expect(quantityKeys).toContain(quantityKey)
    }
  })

  it('enters settings of the catalogue within their range, and all that are needed', () => {
    for (const { key, value } of example.settings) {
      const known = settingsCatalogue.find((setting) => setting.key === key)
      expect(value, key).toBeGreaterThanOrEqual(known?.minimum ?? Infinity)
      expect(value, key).toBeLessThanOrEqual(known?.maximum ?? -Infinity)
    }
    const entered = example.settings.map(({ key }) => key)
    const needed = settingsCatalogue.flatMap(({ key, isNeeded }) => (isNeeded ? [key] : []))
    expect(entered).toEqual(expect.arrayContaining(needed))
  })
})

describe('the two example jobs', () => {
  const [north, lower] = names.map((name) => readExample(name).example)

  it.each([
    ['people', (job: typeof north) => [job?.producer.name, job?.producer.email, job?.job.title]],
    ['herd', (job: typeof north) => [job?.plan.herd]],
    ['grade and width', (job: typeof north) => [job?.plan.ramp?.gradeRunPerRise, job?.plan.ramp?.widthFt]],
    ['settings', (job: typeof north) => [job?.settings.map(({ value }) => value)]],
    ['prices', (job: typeof north) => [job?.costList.lines]],
    ['rates', (job: typeof north) => [job?.schedules[0]?.lines.map(({ baseRate }) => baseRate)]],
    ['share of the cost', (job: typeof north) => [job?.schedules[1]?.percent, job?.schedules[1]?.cap]],
    ['fence', (job: typeof north) => [job?.plan.fence?.runs]],
    ['what the landowner asks for', (job: typeof north) => [job?.landownerAsks]],
  ])('differ in their %s', (_, pick) => {
    pick(north).forEach((value, index) => expect(value).not.toEqual(pick(lower)[index]))
  })
})
