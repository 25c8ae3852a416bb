import { describe, expect, it } from 'vitest'
import type { FencePlan } from '../../schemas/fence-plan.js'
import { workedFence } from '../../../test/worked-fence.js'
import { openFenceEnds } from './open-fence-ends.js'

const without = (name: string): FencePlan => ({
  ...workedFence,
  runs: workedFence.runs.filter((run) => run.name !== name),
})
const named = (runs: readonly (readonly [string, string])[], nodes?: FencePlan['nodes']): FencePlan => {
  const [first] = workedFence.runs
  if (!first) throw new Error('the worked fence has runs')
  return {
    ...workedFence,
    nodes,
    runs: runs.map(([startsAt, endsAt], index) => ({
      ...first,
      name: `run ${index}`,
      path: { lengthFt: 100, startsAt, endsAt },
    })),
  }
}

describe('openFenceEnds', () => {
  it('finds none where fence, lane and panel close the ring', () => {
    expect(openFenceEnds(workedFence)).toEqual([])
  })

  it('names both ends that a missing panel leaves open', () => {
    expect(openFenceEnds(without('closing panel'))).toEqual(['the end of lane west', 'the end of lane east'])
  })

  it('takes ends half a foot apart for one post and no more', () => {
    const moved = (by: number): FencePlan => ({
      ...workedFence,
      runs: workedFence.runs.map((run) =>
        run.role === 'closing' && 'points' in run.path
          ? { ...run, path: { points: run.path.points.map((p) => ({ ...p, northFt: p.northFt - by })) } }
          : run,
      ),
    })
    expect(openFenceEnds(moved(0.5))).toEqual([])
    expect(openFenceEnds(moved(0.6))).toHaveLength(4)
  })

  it('joins runs by the names of their ends, and to a post that stands already', () => {
    expect(
      openFenceEnds(
        named([
          ['a', 'b'],
          ['b', 'a'],
        ]),
      ),
    ).toEqual([])
    expect(
      openFenceEnds(
        named([
          ['a', 'b'],
          ['b', 'c'],
        ]),
      ),
    ).toEqual(['the start of run 0', 'the end of run 1'])
    const standing = ['a', 'c'].map((label) => ({ label, existing: true }))
    expect(
      openFenceEnds(
        named(
          [
            ['a', 'b'],
            ['b', 'c'],
          ],
          standing,
        ),
      ),
    ).toEqual([])
  })

  it('does not judge an end that is known neither by place nor by name', () => {
    const [first] = workedFence.runs
    if (!first) throw new Error('the worked fence has runs')
    expect(openFenceEnds({ ...workedFence, runs: [{ ...first, path: { lengthFt: 100 } }] })).toBeUndefined()
  })
})
