import { EngineeringInputError } from '../engineering-input-error.js'
import { requireNumber } from '../require-number.js'
import { forWords } from '../for-words.js'
import type { FenceGate } from './fence-input.js'

interface Stretch {
  fromFt: number
  toFt: number
  /** A gate post stands at one of its ends. */
  besideGate: boolean
}

interface RunPullsInput {
  lengthFt: number
  corners: readonly { atFt: number }[]
  gates: readonly FenceGate[]
  /** Where the run stands in the input, such as runs[0]. */
  at: string
}

/**
 * Pulls of a run: the stretches between its ends, corners and gates. A gate's opening is taken from its pull and
 * splits it. A gate without a place stands in the middle of the first pull that is wide enough, one without a gate first.
 *
 * @returns lengths in ft, in order along the run; their sum is the run less its gates.
 * @throws EngineeringInputError naming gates[i].widthFt or gates[i].atFt.
 * Common practice, no source.
 * @example runPulls({ lengthFt: 100, corners: [{ atFt: 60 }], gates: [{ widthFt: 14 }], at: 'runs[0]' }) // [23, 23, 40]
 */
export function runPulls({ lengthFt, corners, gates, at }: RunPullsInput): number[] {
  const bounds = [0, ...corners.map(({ atFt }) => atFt), lengthFt]
  const start: Stretch[] = bounds
    .slice(1)
    .map((toFt, index) => ({ fromFt: bounds[index] ?? 0, toFt, besideGate: false }))
  // Gates with a place go first, so that one without a place does not take theirs.
  const order = [...gates.entries()].sort(
    ([, a], [, b]) => Number(a.atFt === undefined) - Number(b.atFt === undefined),
  )
  const stretches = order.reduce(
    (left, [index, gate]) => withGate(left, gate, `${at}.gates[${index}]`),
    start,
  )
  return stretches.map(({ fromFt, toFt }) => toFt - fromFt)
}

function withGate(stretches: readonly Stretch[], gate: FenceGate, at: string): Stretch[] {
  const widthFt = requireNumber({ field: `${at}.widthFt`, value: gate.widthFt, exclusiveMin: 0 })
  const wide = ({ fromFt, toFt }: Stretch) => toFt - fromFt > widthFt
  const chosen =
    gate.atFt === undefined
      ? (stretches.find((stretch) => wide(stretch) && !stretch.besideGate) ?? stretches.find(wide))
      : stretches.find(around(requireNumber({ field: `${at}.atFt`, value: gate.atFt, min: 0 }), widthFt))
  if (!chosen) throw gate.atFt === undefined ? tooWide(at, widthFt) : misplaced(at, gate.atFt)
  const middle = gate.atFt ?? (chosen.fromFt + chosen.toFt) / 2
  const split: Stretch[] = [
    { fromFt: chosen.fromFt, toFt: middle - widthFt / 2, besideGate: true },
    { fromFt: middle + widthFt / 2, toFt: chosen.toFt, besideGate: true },
  ]
  return stretches.flatMap((stretch) => (stretch === chosen ? split : [stretch]))
}

const around = (atFt: number, widthFt: number) => {
  const [from, to] = [atFt - widthFt / 2, atFt + widthFt / 2]
  return (stretch: Stretch) => from > stretch.fromFt && to < stretch.toFt
}

const tooWide = (at: string, widthFt: number) =>
  new EngineeringInputError({
    field: `${at}.widthFt`,
    message: `${at}.widthFt is ${forWords(widthFt)}; no pull of the run is longer than that.`,
  })

const misplaced = (at: string, atFt: number) =>
  new EngineeringInputError({
    field: `${at}.atFt`,
    message: `${at}.atFt is ${forWords(atFt)}; the gate must stand within one pull, clear of corners, ends and other gates.`,
  })
