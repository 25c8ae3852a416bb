import { bracketedRoot } from './bracketed-root.js'
import type { ChannelSection } from './channel-section.js'
import { flowAtDepth, type ChannelFlowResult } from './flow-at-depth.js'
import { MANNING_K } from './hydraulic-constants.js'
import { grassRoughness, type Retardance } from './retardance-curve.js'
import { sectionGeometry } from './section-geometry.js'

export interface GrassFlow extends ChannelFlowResult {
  roughness: number
  /** V·R lies outside the range of the curve and was held at its end. */
  clamped: boolean
}

interface GrassFlowInput {
  section: ChannelSection
  depthFt: number
  retardance: Retardance
  slopeFtPerFt: number
}

/**
 * Uniform flow over grass at a given depth, where n depends on V·R and V on n: V·R · n(V·R) = 1.486 R^(5/3) S^½.
 *
 * @param input checked values, depth greater than 0.
 * @returns as `channelFlow`, with the roughness that was found.
 * Source: see `grassRoughness`.
 * @example grassFlow({ section, depthFt: 1, retardance: 'D', slopeFtPerFt: 0.01 }).roughness
 */
export function grassFlow({ section, depthFt, retardance, slopeFtPerFt }: GrassFlowInput): GrassFlow {
  const { areaFt2, wettedPerimeterFt } = sectionGeometry(section, depthFt)
  const R = areaFt2 / wettedPerimeterFt
  const wanted = MANNING_K * R ** (5 / 3) * Math.sqrt(slopeFtPerFt)
  // On a log scale: V·R spans from a trickle to a river, and n changes with its logarithm.
  const logVr = bracketedRoot({
    f: (ln) => Math.exp(ln) * grassRoughness(retardance, Math.exp(ln)).roughness - wanted,
    low: Math.log(1e-9),
    high: Math.log(1e6),
    tolerance: 1e-12,
  })
  const { roughness, clamped } = grassRoughness(retardance, Math.exp(logVr))
  return { ...flowAtDepth({ section, depthFt, roughness, slopeFtPerFt }), roughness, clamped }
}
