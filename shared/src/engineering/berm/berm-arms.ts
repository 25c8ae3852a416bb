import { requireNumber } from '../require-number.js'
import type { BermDesignInput, BermEnd, BermSide } from './berm-design-types.js'

export interface BermArms {
  lengthFt: number
  ends: BermEnd[]
  /** Largest flow, length and fall of an arm. */
  armFlowCfs: number
  channelFallFt: number
}

type BermArmsInput = Pick<
  BermDesignInput,
  'flowCfs' | 'channelGradeFtPerFt' | 'rampWidthFt' | 'rampEdgeCutFt' | 'pastEdgeFt' | 'falls' | 'outlets'
>

const SIDES: readonly BermSide[] = ['left', 'right']

/**
 * Length of a berm and the arms of its channel: L = ramp width + 2 · edge cut + what it reaches past each edge.
 * It falls one way, or both ways from a crown at the middle of the ramp; the arms then share the flow by length.
 *
 * @returns lengths and falls in ft, flows in cfs.
 * @throws EngineeringInputError naming rampWidthFt, rampEdgeCutFt, pastEdgeFt.left or pastEdgeFt.right.
 * Common practice, no source.
 * @example bermArms({ flowCfs: 7, channelGradeFtPerFt: 0.008, rampWidthFt: 18, rampEdgeCutFt: 0, pastEdgeFt: { left: 45, right: 15 }, falls: 'left', outlets: [] }).lengthFt // 78
 */
export function bermArms(input: BermArmsInput): BermArms {
  const width = requireNumber({ field: 'rampWidthFt', value: input.rampWidthFt, exclusiveMin: 0 })
  const edgeCut = requireNumber({ field: 'rampEdgeCutFt', value: input.rampEdgeCutFt, min: 0 })
  const past = {
    left: requireNumber({ field: 'pastEdgeFt.left', value: input.pastEdgeFt.left, min: 0 }),
    right: requireNumber({ field: 'pastEdgeFt.right', value: input.pastEdgeFt.right, min: 0 }),
  }
  const lengthFt = width + 2 * edgeCut + past.left + past.right
  const ends = SIDES.map((side) => {
    const isOutlet = input.falls === 'both' || input.falls === side
    const ownLength = input.falls === 'both' ? width / 2 + edgeCut + past[side] : lengthFt
    const armLengthFt = isOutlet ? ownLength : 0
    const outlet = input.outlets.find((candidate) => candidate.side === side)
    return {
      side,
      pastEdgeFt: past[side],
      isOutlet,
      armLengthFt,
      armFlowCfs: input.flowCfs * (armLengthFt / lengthFt),
      armFallFt: armLengthFt * input.channelGradeFtPerFt,
      ...(isOutlet && outlet ? { outlet } : {}),
    }
  })
  return {
    lengthFt,
    ends,
    armFlowCfs: Math.max(...ends.map(({ armFlowCfs }) => armFlowCfs)),
    channelFallFt: Math.max(...ends.map(({ armFallFt }) => armFallFt)),
  }
}
