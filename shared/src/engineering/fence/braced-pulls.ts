import type { FenceNodeResult } from './fence-nodes.js'
import type { RunLayout } from './run-layout.js'
import { wholePieces } from './whole-pieces.js'

export interface BracedPulls {
  /** In-line braces counted in each run, by run. */
  inLineBraces: number[]
  /** Ends of pulls at which the wire is tied off, by run. */
  pullEnds: number[]
}

interface BracedPullsInput {
  layouts: readonly RunLayout[]
  nodes: readonly FenceNodeResult[]
  maxPullFt: number
}

interface Piece {
  runIndex: number
  lengthFt: number
}

/**
 * A pull is the fence between two braced points, so it goes on through a post at which two like runs meet in a
 * straight line. In-line braces of a pull = ceil(pull/maxPull − 1e-9) − 1; each pull has two ends to tie off.
 *
 * @returns in-line braces and pull ends by run; a pull over several runs is counted in its first.
 * Common practice; the longest pull is a district setting.
 */
export function bracedPulls({ layouts, nodes, maxPullFt }: BracedPullsInput): BracedPulls {
  const pieces = layouts.map(({ pullsFt }, runIndex) =>
    pullsFt.map((lengthFt): Piece => ({ runIndex, lengthFt })),
  )
  const through = nodes.filter(({ kind, changesFence }) => kind === 'through' && !changesFence)
  const pulls = through.reduce<Piece[][]>(
    (open, { ends }) => {
      const [a, b] = ends.map(({ runIndex, side }) => pieces[runIndex]?.at(side === 'start' ? 0 : -1))
      const first = open.find((pull) => pull.some((piece) => piece === a))
      const second = open.find((pull) => pull.some((piece) => piece === b))
      if (!first || !second || first === second) return open
      return open.flatMap((pull) =>
        pull === first ? [[...first, ...second]] : pull === second ? [] : [pull],
      )
    },
    pieces.flat().map((piece) => [piece]),
  )
  const inLineBraces = layouts.map((_, index) =>
    pulls.reduce((sum, pull) => (firstRun(pull) === index ? sum + bracesIn(pull, maxPullFt) : sum), 0),
  )
  const straightOn = through.flatMap(({ ends }) => ends.map(({ runIndex }) => runIndex))
  const pullEnds = layouts.map(
    ({ pullsFt }, index) => 2 * pullsFt.length - straightOn.filter((runIndex) => runIndex === index).length,
  )
  return { inLineBraces, pullEnds }
}

const firstRun = (pull: readonly Piece[]) => Math.min(...pull.map(({ runIndex }) => runIndex))

function bracesIn(pull: readonly Piece[], maxPullFt: number): number {
  const lengthFt = pull.reduce((sum, piece) => sum + piece.lengthFt, 0)
  return wholePieces(lengthFt, maxPullFt) - 1
}
