import type { FenceNodeKind, FenceNodeResult } from './fence-nodes.js'
import type { FenceBraces, FencePosts, FenceRunResult } from './fence-result.js'
import type { RunLayout } from './run-layout.js'

interface FenceCountsInput {
  layouts: readonly RunLayout[]
  nodes: readonly FenceNodeResult[]
  runs: readonly FenceRunResult[]
}

interface FenceCounts {
  posts: FencePosts
  braces: FenceBraces
  insulators: { line: number; strain: number }
}

const POSTS_PER_GATE = 2
const BRACES_PER_GATE = 2
const BRACES_PER_CORNER = 2

const total = <T>(items: readonly T[], of: (item: T) => number) =>
  items.reduce((sum, item) => sum + of(item), 0)

/**
 * Posts, braces and insulators over all runs and the places where they meet. Line insulators = hot wires · posts that
 * the wire passes; strain insulators = hot wires · posts that it is tied to. Ground-return wires take none.
 *
 * @returns counts of pieces.
 * Common practice, no source.
 */
export function fenceCounts({ layouts, nodes, runs }: FenceCountsInput): FenceCounts {
  const posts = (kind: FenceNodeKind) => total(nodes, (node) => (node.kind === kind ? node.posts : 0))
  const braces = (kind: FenceNodeKind) => total(nodes, (node) => (node.kind === kind ? node.braces : 0))
  const corners = total(runs, (run) => run.corners)
  const gates = total(runs, (run) => run.gates)
  const isPassed = ({ kind, changesFence }: FenceNodeResult) => kind === 'through' && !changesFence
  const parts = {
    corner: corners * BRACES_PER_CORNER + braces('corner'),
    tee: braces('tee'),
    end: braces('end'),
    gate: gates * BRACES_PER_GATE,
    inLine: total(runs, (run) => run.inLineBraces),
  }
  return {
    posts: {
      line: total(runs, (run) => run.linePosts),
      corner: corners + posts('corner'),
      tee: posts('tee'),
      end: posts('end'),
      gate: gates * POSTS_PER_GATE,
      through: posts('through'),
    },
    braces: { ...parts, total: total(Object.values(parts), (count) => count) },
    insulators: {
      line:
        total(runs, (run) => run.lineInsulators) +
        total(nodes, (node) => (isPassed(node) ? node.hotWires : 0)),
      strain:
        total(
          layouts,
          ({ hotWires, path, run }) => hotWires * (path.corners.length + POSTS_PER_GATE * run.gates.length),
        ) + total(nodes, (node) => (isPassed(node) ? 0 : node.hotWires)),
    },
  }
}
