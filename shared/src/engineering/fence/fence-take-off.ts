import { EngineeringInputError } from '../engineering-input-error.js'
import { requireNumber } from '../require-number.js'
import { bracedPulls } from './braced-pulls.js'
import { checkFenceRun } from './check-fence-run.js'
import { fenceAreas } from './fence-areas.js'
import { fenceCounts } from './fence-counts.js'
import { fenceEnergizer } from './fence-energizer.js'
import type { FenceTakeOffInput } from './fence-input.js'
import { fenceNodes, type FenceNodeResult } from './fence-nodes.js'
import type { FenceRunResult, FenceTakeOffResult } from './fence-result.js'
import { fenceWire } from './fence-wire.js'
import { runLayout, type RunLayout } from './run-layout.js'
import { wholePieces } from './whole-pieces.js'

/**
 * Take-off of a fence of several runs: posts, braces, wire, insulators, gates, energizer, ground rods, setback, areas.
 * Line posts = Σ over pulls (ceil(pull/spacing − 1e-9) − 1). Braces: one at an end, two at a corner inside a run, one
 * for each run that ends at a corner or tee, one each side of a gate, in-line where a pull exceeds maxPullFt.
 * Brace posts are counted apart; line posts are not reduced for them.
 *
 * @returns lengths in ft, areas in ft², counts; setback and areas are absent where the geometry is not given.
 * @throws EngineeringInputError naming the field; naming runs[i].energized for an energized run in the water.
 * Source: line posts per run, Hoover Fence, fence quantities; energizer and rods, see `fenceEnergizer`; the rest
 * common practice.
 * @example fenceTakeOff({ runs: [{ name: 'north', role: 'other', path: { lengthFt: 75 }, fence: 'barbed', energized: false, inWater: false, wires: 4, postSpacingFt: 8, gates: [], wireKind: 'barbed' }], cornerAngleDeg: 20, maxPullFt: 660, rollLengthFt: { barbed: 1320 }, wastePercent: 5, energizerRule: { basis: 'fence-mile', joulesPerMile: 1 }, groundRodRule: { rodFtPerJoule: 3, rodLengthFt: 8, minimumRods: 3 } }).posts.line // 9
 */
export function fenceTakeOff(input: FenceTakeOffInput): FenceTakeOffResult {
  if (input.runs.length === 0) {
    throw new EngineeringInputError({
      field: 'runs',
      message: 'runs is empty; give at least one run of fence.',
    })
  }
  const angle = { value: input.cornerAngleDeg, min: 0, max: 180 }
  const cornerAngleDeg = requireNumber({ field: 'cornerAngleDeg', ...angle })
  const maxPullFt = requireNumber({ field: 'maxPullFt', value: input.maxPullFt, exclusiveMin: 0 })
  const layouts = input.runs.map((run, index) => {
    checkFenceRun(run, `runs[${index}]`)
    return runLayout({ run, cornerAngleDeg, at: `runs[${index}]` })
  })
  const nodes = fenceNodes({ layouts, nodes: input.nodes ?? [], cornerAngleDeg })
  const { inLineBraces, pullEnds } = bracedPulls({ layouts, nodes, maxPullFt })
  const runs = layouts.map((layout, index) => runResult(layout, inLineBraces[index] ?? 0))
  const energizer = energizerOf(layouts, input)
  const { areas, notes } = fenceAreas({ ...input, layouts })
  const gates = input.runs.flatMap((run) => run.gates)
  return {
    runs,
    nodes,
    lengthFt: sum(runs.map(({ lengthFt }) => lengthFt)),
    fencedLengthFt: sum(runs.map(({ fencedLengthFt }) => fencedLengthFt)),
    ...fenceCounts({ layouts, nodes, runs }),
    gates: { count: gates.length, totalWidthFt: sum(gates.map(({ widthFt }) => widthFt)) },
    wire: fenceWire({ ...input, layouts, pullEnds }),
    ...(energizer && { energizer }),
    ...areas,
    notes: [...notes, ...(energizer?.notes ?? []), ...nodes.flatMap(changeNote)],
  }
}

const changeNote = ({ changesFence, runs }: FenceNodeResult) =>
  changesFence
    ? [
        `${runs.join(' and ')} meet in a straight line but differ: each is tied off at that post, without a brace.`,
      ]
    : []

const sum = (values: readonly number[]) => values.reduce((total, value) => total + value, 0)

function runResult(layout: RunLayout, inLineBraces: number): FenceRunResult {
  const { run, path, pullsFt, fencedLengthFt, hotWires } = layout
  const linePosts = sum(pullsFt.map((pull) => wholePieces(pull, run.postSpacingFt) - 1))
  return {
    name: run.name,
    lengthFt: path.lengthFt,
    fencedLengthFt,
    pullsFt,
    corners: path.corners.length,
    deflectionsDeg: path.corners.map(({ deflectionDeg }) => deflectionDeg),
    gates: run.gates.length,
    linePosts,
    inLineBraces,
    wireFt: fencedLengthFt * run.wires,
    hotWireFt: fencedLengthFt * hotWires,
    lineInsulators: linePosts * hotWires,
  }
}

function energizerOf(layouts: readonly RunLayout[], input: FenceTakeOffInput) {
  const energized = layouts.filter(({ run }) => run.energized)
  if (energized.length === 0) return undefined
  return fenceEnergizer({
    ...input,
    fenceFt: sum(energized.map(({ fencedLengthFt }) => fencedLengthFt)),
    hotWireFt: sum(energized.map(({ fencedLengthFt, hotWires }) => fencedLengthFt * hotWires)),
  })
}
