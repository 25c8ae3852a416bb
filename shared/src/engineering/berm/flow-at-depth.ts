import type { ChannelSection } from './channel-section.js'
import { GRAVITY_FT_PER_S2, MANNING_K } from './hydraulic-constants.js'
import { sectionGeometry, type SectionGeometry } from './section-geometry.js'

export interface ChannelFlowResult extends SectionGeometry {
  hydraulicRadiusFt: number
  velocityFtPerS: number
  flowCfs: number
  froude: number
}

interface FlowAtDepthInput {
  section: ChannelSection
  depthFt: number
  roughness: number
  slopeFtPerFt: number
}

const DRY: ChannelFlowResult = {
  areaFt2: 0,
  wettedPerimeterFt: 0,
  hydraulicRadiusFt: 0,
  topWidthFt: 0,
  velocityFtPerS: 0,
  flowCfs: 0,
  froude: 0,
}

/**
 * `channelFlow` without its checks: the root finder asks for it hundreds of times for one design.
 *
 * @param input checked values.
 * @returns as `channelFlow`.
 * @example flowAtDepth({ section, depthFt: 0, roughness: 0.03, slopeFtPerFt: 0.01 }).flowCfs // 0
 */
export function flowAtDepth({
  section,
  depthFt,
  roughness,
  slopeFtPerFt,
}: FlowAtDepthInput): ChannelFlowResult {
  if (depthFt === 0) return { ...DRY }
  const geometry = sectionGeometry(section, depthFt)
  const { areaFt2: A, wettedPerimeterFt: P, topWidthFt: T } = geometry
  const R = A / P
  const V = (MANNING_K / roughness) * R ** (2 / 3) * Math.sqrt(slopeFtPerFt)
  return {
    ...geometry,
    hydraulicRadiusFt: R,
    velocityFtPerS: V,
    flowCfs: A * V,
    froude: V / Math.sqrt((GRAVITY_FT_PER_S2 * A) / T),
  }
}
