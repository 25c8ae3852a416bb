import { EngineeringInputError } from '../engineering-input-error.js'
import { requireNumber } from '../require-number.js'
import { bracketedRoot } from './bracketed-root.js'
import type { ChannelSection } from './channel-section.js'
import { checkedSection } from './checked-section.js'
import { flowAtDepth, type ChannelFlowResult } from './flow-at-depth.js'
import { grassFlow } from './grass-flow.js'
import { RETARDANCE_SOURCE, type Retardance } from './retardance-curve.js'

export interface NormalDepthInput {
  section: ChannelSection
  /** Flow, cfs, 0 or more. */
  flowCfs: number
  /** Manning n, 0.005 to 1; not needed with `resistance`. */
  roughness?: number
  /** Grass of a retardance class in place of a fixed n. */
  resistance?: { retardance: Retardance }
  /** Slope of the channel, ft/ft, greater than 0 and at most 1. */
  slopeFtPerFt: number
}

export interface NormalDepthResult extends ChannelFlowResult {
  depthFt: number
  roughness: number
  notes: string[]
}

type FlowOverDepth = (depthFt: number) => ChannelFlowResult & { roughness: number; clamped: boolean }

const DEEPEST_FT = 1000
const TOLERANCE_FT = 1e-12
const RETARDANCES: readonly string[] = ['A', 'B', 'C', 'D', 'E']

/**
 * Depth of uniform flow with the flow at that depth beside it. The bracket doubles from 1 ft to 1,000 ft, then halves.
 *
 * @returns depth in ft and the flow of `channelFlow` there; depth 0 for flow 0.
 * @throws EngineeringInputError naming the field; naming flowCfs when 1,000 ft of depth does not carry the flow.
 * Source: FHWA HEC-22, 4th ed., Feb 2024, ch. 6, eqs 6.5 to 6.9.
 * @example normalDepth({ section, flowCfs: 28, roughness: 0.03, slopeFtPerFt: 0.01 }).depthFt
 */
export function normalDepth(input: NormalDepthInput): NormalDepthResult {
  const flowCfs = requireNumber({ field: 'flowCfs', value: input.flowCfs, min: 0 })
  const flowOver = flowFunction(input)
  const depthFt = flowCfs === 0 ? 0 : depthFor(flowCfs, flowOver)
  const { clamped, ...flow } = flowOver(depthFt)
  const notes = [
    ...(input.resistance ? [`Roughness by the ${RETARDANCE_SOURCE}.`] : []),
    ...(clamped ? ['Velocity times hydraulic radius lies outside the curve; its end is used.'] : []),
  ]
  return { ...flow, depthFt, notes }
}

function depthFor(flowCfs: number, flowOver: FlowOverDepth): number {
  let high = 1
  while (flowOver(high).flowCfs < flowCfs) {
    if (high >= DEEPEST_FT) {
      const message = `flowCfs is ${flowCfs}; the channel does not carry it even ${DEEPEST_FT} ft deep.`
      throw new EngineeringInputError({ field: 'flowCfs', message })
    }
    high = Math.min(high * 2, DEEPEST_FT)
  }
  return bracketedRoot({
    f: (depthFt) => flowOver(depthFt).flowCfs - flowCfs,
    low: 0,
    high,
    tolerance: TOLERANCE_FT,
  })
}

function flowFunction(input: NormalDepthInput): FlowOverDepth {
  const section = checkedSection(input.section)
  const slopeFtPerFt = requireNumber({
    field: 'slopeFtPerFt',
    value: input.slopeFtPerFt,
    exclusiveMin: 0,
    max: 1,
  })
  if (!input.resistance) {
    const roughness = requireNumber({ field: 'roughness', value: input.roughness, min: 0.005, max: 1 })
    return (depthFt) => ({
      ...flowAtDepth({ section, depthFt, roughness, slopeFtPerFt }),
      roughness,
      clamped: false,
    })
  }
  const { retardance } = input.resistance
  if (!RETARDANCES.includes(retardance)) {
    const message = 'resistance.retardance is not known; it must be A, B, C, D or E.'
    throw new EngineeringInputError({ field: 'resistance.retardance', message })
  }
  return (depthFt) => grassFlow({ section, depthFt, retardance, slopeFtPerFt })
}
