import type { FenceRun } from './fence-input.js'
import { runPath, type RunPath } from './run-path.js'
import { runPulls } from './run-pulls.js'

export interface RunLayout {
  run: FenceRun
  hotWires: number
  path: RunPath
  pullsFt: number[]
  fencedLengthFt: number
}

/**
 * One run laid out: its path, its pulls, and how many of its wires are hot.
 *
 * @param at where the run stands in the input, such as runs[0].
 * @throws EngineeringInputError naming a field of path or gates.
 * @example runLayout({ run, cornerAngleDeg: 20, at: 'runs[0]' }).pullsFt
 */
export function runLayout(input: { run: FenceRun; cornerAngleDeg: number; at: string }): RunLayout {
  const { run, cornerAngleDeg, at } = input
  const path = runPath({ path: run.path, cornerAngleDeg, at: `${at}.path` })
  const pullsFt = runPulls({ lengthFt: path.lengthFt, corners: path.corners, gates: run.gates, at })
  return {
    run,
    hotWires: run.hotWires ?? (run.energized ? run.wires : 0),
    path,
    pullsFt,
    fencedLengthFt: pullsFt.reduce((sum, pull) => sum + pull, 0),
  }
}
