import { requireNumber } from '../require-number.js'
import type { ChannelSection } from './channel-section.js'
import { checkedSection } from './checked-section.js'
import { flowAtDepth, type ChannelFlowResult } from './flow-at-depth.js'

export interface ChannelFlowInput {
  section: ChannelSection
  /** Water depth, ft, 0 to 1,000. */
  depthFt: number
  /** Manning n, 0.005 to 1. */
  roughness: number
  /** Slope of the channel, ft/ft, greater than 0 and at most 1. */
  slopeFtPerFt: number
}

/**
 * Uniform flow in a channel at a given depth: V = (1.486/n) R^⅔ S^½, Q = A·V, Froude V/√(g·A/T), g = 32.174 ft/s².
 *
 * @returns area, perimeter, radius, top width, velocity in ft/s, flow in cfs and Froude number; all 0 at depth 0.
 * @throws EngineeringInputError naming the field.
 * Source: FHWA HEC-22, Urban Drainage Design Manual, 4th ed., FHWA-HIF-24-006, Feb 2024, ch. 6, eqs 6.5 to 6.9.
 * @example channelFlow({ section: { shape: 'trapezoid', bottomWidthFt: 2.6, leftRunPerRise: 3, rightRunPerRise: 3 }, depthFt: 1.6, roughness: 0.03, slopeFtPerFt: 0.01 }).flowCfs // 55.9
 */
export function channelFlow(input: ChannelFlowInput): ChannelFlowResult {
  return flowAtDepth({
    section: checkedSection(input.section),
    depthFt: requireNumber({ field: 'depthFt', value: input.depthFt, min: 0, max: 1000 }),
    roughness: requireNumber({ field: 'roughness', value: input.roughness, min: 0.005, max: 1 }),
    slopeFtPerFt: requireNumber({
      field: 'slopeFtPerFt',
      value: input.slopeFtPerFt,
      exclusiveMin: 0,
      max: 1,
    }),
  })
}
