import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { workedInput, workedPlan } from '../../../test/worked-example.js'
import type { DesignPlan } from '../../schemas/design-plan.js'
import { computeDesign } from './compute-design.js'
import { designParts } from './design-parts.js'
import type { DesignInput } from './design-input.js'
import type { PartResult } from './part-result.js'

type Path = readonly (string | number)[]

/** Every place of the plan that can be empty, but for the survey, which is no part of it. */
function placesIn(value: unknown, path: Path = []): Path[] {
  const below =
    typeof value === 'object' && value !== null
      ? Object.entries(value).flatMap(([key, child]) =>
          placesIn(child, [...path, Array.isArray(value) ? Number(key) : key]),
        )
      : []
  return path.length > 0 ? [path, ...below] : below
}

type PlannedPart = Exclude<keyof DesignPlan, 'inputVersion' | 'funding'>

const planned = Object.keys(workedPlan).filter(
  (key): key is PlannedPart => key !== 'inputVersion' && key !== 'funding',
)
const places = planned.flatMap((part) => placesIn(workedPlan[part], [part]))

const left = Symbol('left out')
/** What a form holds while somebody types. */
const halfTyped = [left, undefined, null, Number.NaN, '', 0, -1, 0.5, 1e15, 'abc', [], {}] as const

function withEmptied(emptied: readonly (readonly [Path, unknown])[]): DesignInput {
  const input: DesignInput = structuredClone(workedInput)
  for (const [path, value] of emptied) {
    const key = path.at(-1) ?? ''
    const holder = path
      .slice(0, -1)
      .reduce<unknown>((node, step) => (node as { [step: string]: unknown } | undefined)?.[step], input)
    // An earlier one may have taken away the place of this one.
    if (typeof holder !== 'object' || holder === null) continue
    if (value === left) Reflect.deleteProperty(holder, key)
    else Reflect.set(holder, key, value)
  }
  return input
}

const isSaid = (part: PartResult<unknown>): boolean => {
  if (part.ok) return true
  if ('waitingFor' in part) return part.waitingFor.length > 0
  return part.field.length > 0 && /^\S+ .*\.$/s.test(part.message)
}

const whole = ['quantities', 'cost', 'funding'] as const

describe('a plan that is filled in over days', () => {
  it('is worked out as far as it goes, whatever is missing or half typed, and each part says what it needs', () => {
    const emptied = fc.tuple(fc.constantFrom(...places), fc.constantFrom(...halfTyped))
    fc.assert(
      fc.property(fc.array(emptied, { minLength: 1, maxLength: 6 }), (changes) => {
        const result = computeDesign(withEmptied(changes))
        for (const part of [...designParts, ...whole]) expect(isSaid(result[part])).toBe(true)
        // JSON turns what is no number into null, so this also says that no figure is NaN or endless.
        expect(JSON.parse(JSON.stringify(result))).toEqual(result)
      }),
      { numRuns: 300 },
    )
  }, 60_000)

  it('keeps every part that does not need what is missing', () => {
    const needs: { [part: string]: readonly string[] } = {
      herd: ['herd', 'pond'],
      site: ['profile', 'approachPad', 'earthwork', 'rock', 'fabric', 'closingPanel', 'pond', 'seeding'],
      ramp: [
        'profile',
        'approachPad',
        'earthwork',
        'rock',
        'fabric',
        'closingPanel',
        'berm',
        'pond',
        'seeding',
      ],
      earthwork: ['earthwork', 'fabric', 'seeding'],
      rock: ['rock', 'earthwork', 'approachPad', 'fabric', 'seeding'],
      fabric: ['fabric'],
      fence: ['fence'],
      runoff: ['runoff', 'berm', 'seeding'],
      berm: ['berm', 'seeding'],
      seeding: ['seeding'],
    }
    for (const name of planned) {
      const result = computeDesign(withEmptied([[[name], left]]))
      const notReady = designParts.filter((part) => !result[part].ok)
      expect(new Set(notReady), name).toEqual(new Set(needs[name] ?? []))
    }
  })

  it.each([
    [['rock', 'layers', 1, 'thicknessIn'], left, 'rock', 'rock.layers[1].thicknessIn', /from 1 to 60 in/],
    [['fence', 'rollLengthFt'], left, 'fence', 'fence.rollLengthFt', /still empty/],
    [['runoff', 'distribution'], '', 'runoff', 'runoff.distribution', /still empty/],
    [['pads', 'approach', 'thicknessIn'], NaN, 'approachPad', 'pads.approach.thicknessIn', /from 2 to 36 in/],
    [['closingPanel', 'clearFt'], null, 'closingPanel', 'closingPanel.clearFt', /from 0 to 20 ft/],
    [['pond', 'stages', 2, 'areaFt2'], -4, 'pond', 'pond.stages[2].areaFt2', /at least 0/],
    [['seeding', 'mix', 0, 'purity'], 97, 'seeding', 'seeding.mix[0].purity', /at most 1/],
    [['site', 'fullPoolElevationFt'], left, 'profile', 'site.fullPoolElevationFt', /Give a number/],
  ] as const)(
    'says of %j as %j where it stands and what would be right',
    (path, value, part, field, message) => {
      expect(computeDesign(withEmptied([[path, value]]))[part]).toEqual({
        ok: false,
        field,
        message: expect.stringMatching(message),
      })
    },
  )

  it('takes a part that a form has emptied as one that nobody has planned', () => {
    const result = computeDesign(withEmptied([[['closingPanel'], null]]))
    expect(result.closingPanel).toEqual({ ok: true, value: null })
  })

  it('does not take a half-typed pad or panel for a job without one', () => {
    const result = computeDesign(
      withEmptied([
        [['closingPanel', 'clearFt'], left],
        [['pads', 'approach', 'lengthFt'], 0],
      ]),
    )
    expect(result.quantities).toEqual({ ok: false, waitingFor: ['approachPad', 'closingPanel'] })
  })
})
