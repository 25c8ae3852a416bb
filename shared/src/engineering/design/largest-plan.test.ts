import { describe, expect, it } from 'vitest'
import { workedGroundLine, workedInput, workedPlan } from '../../../test/worked-example.js'
import { workedFence } from '../../../test/worked-fence.js'
import { designPlanSchema, type DesignPlan } from '../../schemas/design-plan.js'
import { interpolateGround } from '../survey/interpolate-ground.js'
import { computeDesign } from './compute-design.js'
import type { DesignInput } from './design-input.js'

/** Across the map at 45 degrees, so that the box around each leg overlaps that of every other. */
const aslant = (alongFt: number, acrossFt: number) => ({
  eastFt: alongFt - acrossFt,
  northFt: alongFt + acrossFt,
})

const teeth = (count: number, of: (toothFt: number) => { eastFt: number; northFt: number }[]) =>
  Array.from({ length: count }, (_, tooth) => of(tooth * 4)).flat()

/** A comb of water and a comb of fence that stand between each other's teeth without touching. */
const water = teeth(500, (at) => [aslant(0, at), aslant(9000, at), aslant(9000, at + 1), aslant(0, at + 1)])
const fencePoints = teeth(250, (at) => [
  aslant(9010, at + 2),
  aslant(10, at + 2),
  aslant(10, at + 3),
  aslant(9010, at + 3),
])

const [run] = workedFence.runs
const runs: NonNullable<DesignPlan['fence']>['runs'] = [0, 500].map((from) => ({
  ...(run as NonNullable<typeof run>),
  name: `run ${from}`,
  path: { points: fencePoints.slice(from, from + 500) },
  gates: [],
}))

const plan: DesignPlan = {
  ...workedPlan,
  site: { ...(workedPlan.site as NonNullable<DesignPlan['site']>), waterOutline: water },
  earthwork: { ...(workedPlan.earthwork as NonNullable<DesignPlan['earthwork']>), stationIntervalFt: 1 },
  fence: { ...workedFence, runs },
}

const groundLine = Array.from({ length: 2000 }, (_, index) => {
  const stationFt = (index * 130) / 1999
  return { stationFt, elevationFt: interpolateGround(workedGroundLine, stationFt) }
})

const largest: DesignInput = {
  ...workedInput,
  ...plan,
  site: { ...(plan.site as NonNullable<DesignPlan['site']>), groundLine },
}

describe('the largest plan that may be entered', () => {
  it('is one that the schema takes, and with one more point of fence or water it is not', () => {
    const issuesWith = (parts: Partial<DesignPlan>) =>
      designPlanSchema.safeParse({ ...plan, ...parts }).error?.issues.map(({ path }) => path)
    const last = fencePoints.slice(-1)
    const extra = { ...(runs[1] as (typeof runs)[number]), path: { points: [...last, aslant(0, 0)] } }
    const site = plan.site as NonNullable<DesignPlan['site']>
    expect(issuesWith({})).toBeUndefined()
    expect(issuesWith({ fence: { ...workedFence, runs: [...runs, extra] } })).toEqual([['fence', 'runs']])
    expect(issuesWith({ site: { ...site, waterOutline: [...water, aslant(0, 2000)] } })).toEqual([
      ['site', 'waterOutline'],
    ])
  })

  it('is worked out with its setback', () => {
    const { fence, earthwork } = computeDesign(largest)
    expect(earthwork.ok).toBe(true)
    expect(fence.ok && fence.value.setbackFt).toBeCloseTo(Math.SQRT2, 6)
  })
})
