import { requireNumber } from '../require-number.js'
import { NETTING_KIND, type FenceTakeOffInput } from './fence-input.js'
import type { RunLayout } from './run-layout.js'
import { wholePieces } from './whole-pieces.js'

export interface FenceWire {
  kind: string
  /** Wire along the pulls, ft; `tieOffFt` comes beside it. */
  netFt: number
  tieOffFt: number
  /** With waste, ft. */
  orderFt: number
  rollLengthFt: number
  rolls: number
}

interface FenceWireInput extends Pick<FenceTakeOffInput, 'rollLengthFt' | 'tieOffFt' | 'wastePercent'> {
  layouts: readonly RunLayout[]
  /** Ends of pulls by run. */
  pullEnds: readonly number[]
}

/**
 * Wire by kind over all runs: net = Σ pulls · wires, tie-off = tieOffFt · wires · pull ends, order = both with waste,
 * rolls = whole rolls of that kind. Woven fence takes netting along its pulls, beside its single wires.
 *
 * @returns one line per kind, in the order in which the runs name them.
 * @throws EngineeringInputError naming rollLengthFt.<kind>, tieOffFt or wastePercent.
 * Common practice; waste is a district setting (The Scottish Farmer, "Getting Your Fencing Needs Right", advises 5 %).
 */
export function fenceWire({ layouts, pullEnds, ...input }: FenceWireInput): FenceWire[] {
  const perEnd = requireNumber({ field: 'tieOffFt', value: input.tieOffFt ?? 0, min: 0 })
  const waste = requireNumber({ field: 'wastePercent', value: input.wastePercent, min: 0, max: 100 })
  const used = layouts.flatMap(({ run, fencedLengthFt }, index) => [
    {
      kind: run.wireKind,
      netFt: fencedLengthFt * run.wires,
      tieOffFt: perEnd * run.wires * (pullEnds[index] ?? 0),
    },
    { kind: NETTING_KIND, netFt: run.fence === 'woven' ? fencedLengthFt : 0, tieOffFt: 0 },
  ])
  const kinds = [...new Set(used.filter(({ netFt }) => netFt > 0).map(({ kind }) => kind))]
  return kinds.map((kind) => {
    const own = used.filter((part) => part.kind === kind)
    const netFt = own.reduce((sum, part) => sum + part.netFt, 0)
    const tieOffFt = own.reduce((sum, part) => sum + part.tieOffFt, 0)
    const orderFt = (netFt + tieOffFt) * (1 + waste / 100)
    const value = Object.hasOwn(input.rollLengthFt, kind) ? input.rollLengthFt[kind] : undefined
    const rollLengthFt = requireNumber({ field: `rollLengthFt.${kind}`, value, exclusiveMin: 0 })
    return { kind, netFt, tieOffFt, orderFt, rollLengthFt, rolls: wholePieces(orderFt, rollLengthFt) }
  })
}
