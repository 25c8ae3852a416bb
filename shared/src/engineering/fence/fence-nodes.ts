import { EngineeringInputError } from '../engineering-input-error.js'
import { deflectionDeg } from './deflection-deg.js'
import type { FenceNode } from './fence-input.js'
import { joinedEnds, type PlacedEnd } from './joined-ends.js'
import type { RunLayout } from './run-layout.js'

export type FenceNodeKind = 'end' | 'through' | 'corner' | 'tee' | 'existing'

export interface FenceNodeResult {
  label?: string
  /** Ends of runs that stand here; runIndex counts the runs of the input from 0. */
  ends: { runIndex: number; side: 'start' | 'end' }[]
  kind: FenceNodeKind
  /** Names of the runs that end here. */
  runs: string[]
  posts: number
  braces: number
  deflectionDeg?: number
  /** Two unlike fences meet in a straight line: each is tied off at this post. */
  changesFence: boolean
  /** Hot wires that need an insulator here. */
  hotWires: number
}

interface FenceNodesInput {
  layouts: readonly RunLayout[]
  nodes: readonly FenceNode[]
  cornerAngleDeg: number
}

const UNBRACED: readonly FenceNodeKind[] = ['through', 'existing']

/**
 * Places where runs end. One run: an end post with a brace. Two that turn no more than the corner angle: a through
 * post without a brace. Otherwise a corner or tee: one post, a brace for each run that ends there. A node that exists
 * already takes neither post nor brace. Two runs of which one is not drawn are taken as a corner.
 *
 * @throws EngineeringInputError naming nodes[i].label when no run starts or ends there.
 * Common practice, no source.
 */
export function fenceNodes({ layouts, nodes, cornerAngleDeg }: FenceNodesInput): FenceNodeResult[] {
  const joined = joinedEnds(layouts)
  nodes.forEach(({ label }, index) => {
    if (joined.some((ends) => ends.some((end) => end.label === label))) return
    throw new EngineeringInputError({
      field: `nodes[${index}].label`,
      message: `nodes[${index}].label is "${label}"; no run starts or ends there.`,
    })
  })
  const existing = new Set(nodes.filter((node) => node.existing).map(({ label }) => label))
  return joined.map((ends) => {
    const label = ends.find((end) => end.label !== undefined)?.label
    const turn = turnAt(ends)
    const stands = ends.some((end) => end.label !== undefined && existing.has(end.label))
    const kind = stands ? 'existing' : kindOf(ends.length, turn, cornerAngleDeg)
    return {
      ...(label === undefined ? {} : { label }),
      kind,
      runs: ends.map(({ layout }) => layout.run.name),
      posts: kind === 'existing' ? 0 : 1,
      braces: UNBRACED.includes(kind) ? 0 : ends.length,
      ...(turn === undefined ? {} : { deflectionDeg: turn }),
      changesFence: kind === 'through' && !sameFence(ends),
      hotWires: Math.max(...ends.map(({ layout }) => layout.hotWires)),
      ends: ends.map(({ runIndex, side }) => ({ runIndex, side })),
    }
  })
}

function turnAt([first, second, ...others]: readonly PlacedEnd[]): number | undefined {
  if (others.length > 0 || first?.headingRad === undefined || second?.headingRad === undefined)
    return undefined
  return deflectionDeg(first.headingRad + Math.PI, second.headingRad)
}

function kindOf(ends: number, turn: number | undefined, cornerAngleDeg: number): FenceNodeKind {
  if (ends === 1) return 'end'
  if (ends > 2) return 'tee'
  return turn !== undefined && turn <= cornerAngleDeg ? 'through' : 'corner'
}

function sameFence([first, second]: readonly PlacedEnd[]): boolean {
  if (!first || !second) return false
  const [a, b] = [first.layout, second.layout]
  return (
    a.run.fence === b.run.fence &&
    a.run.wireKind === b.run.wireKind &&
    a.run.wires === b.run.wires &&
    a.hotWires === b.hotWires
  )
}
