import type { FencePlan } from '../../schemas/fence-plan.js'

interface FenceEnd {
  name: string
  label?: string
  point?: { eastFt: number; northFt: number }
}

/** Ends nearer to each other than this are one post. */
const ONE_POST_FT = 0.5

/**
 * Ends of exclusion, lane and closing runs that meet no other end: there the stock could walk round. Undefined when an
 * end is known neither by place nor by name.
 */
export function openFenceEnds(fence: FencePlan): string[] | undefined {
  const ends = fence.runs.filter(({ role }) => role !== 'other').flatMap(runEnds)
  if (ends.some(({ label, point }) => label === undefined && point === undefined)) return undefined
  const existing = new Set((fence.nodes ?? []).filter((node) => node.existing).map(({ label }) => label))
  return ends
    .filter((end, index) => {
      const tiedToExisting = end.label !== undefined && existing.has(end.label)
      return !tiedToExisting && !ends.some((other, place) => place !== index && meet(end, other))
    })
    .map(({ name }) => name)
}

function runEnds({ name, path }: FencePlan['runs'][number]): FenceEnd[] {
  if ('points' in path) {
    return [
      { name: `the start of ${name}`, point: path.points[0] },
      { name: `the end of ${name}`, point: path.points.at(-1) },
    ]
  }
  return [
    { name: `the start of ${name}`, label: path.startsAt },
    { name: `the end of ${name}`, label: path.endsAt },
  ]
}

function meet(a: FenceEnd, b: FenceEnd): boolean {
  if (a.point && b.point) {
    return Math.hypot(a.point.eastFt - b.point.eastFt, a.point.northFt - b.point.northFt) <= ONE_POST_FT
  }
  return a.label !== undefined && a.label === b.label
}
