import type { ChannelSection, ParabolaSection } from './channel-section.js'

export interface SectionGeometry {
  areaFt2: number
  wettedPerimeterFt: number
  topWidthFt: number
}

/**
 * Wetted section of a channel at depth d.
 * Trapezoid: A = bd + ½(z1 + z2)d², P = b + d(√(1+z1²) + √(1+z2²)), T = b + (z1 + z2)d; a triangle has b = 0.
 * Parabola through (T0, D0): T = T0√(d/D0), A = ⅔Td, P = (T/2)[√(1+x²) + ln(x + √(1+x²))/x] with x = 4d/T.
 *
 * @param section a checked section.
 * @param depthFt water depth, ft, greater than 0.
 * @returns area in ft², wetted perimeter and top width in ft.
 * Source: FHWA HEC-22, 4th ed., Feb 2024, ch. 6, eqs 6.7 to 6.9; parabola by exact arc length.
 * @example sectionGeometry({ shape: 'triangle', leftRunPerRise: 3, rightRunPerRise: 3 }, 1).areaFt2 // 3
 */
export function sectionGeometry(section: ChannelSection, depthFt: number): SectionGeometry {
  if (section.shape === 'parabola') return parabolaGeometry(section, depthFt)
  const b = section.shape === 'trapezoid' ? section.bottomWidthFt : 0
  const { leftRunPerRise: z1, rightRunPerRise: z2 } = section
  const d = depthFt
  return {
    areaFt2: b * d + ((z1 + z2) / 2) * d ** 2,
    wettedPerimeterFt: b + d * (Math.sqrt(1 + z1 ** 2) + Math.sqrt(1 + z2 ** 2)),
    topWidthFt: b + (z1 + z2) * d,
  }
}

function parabolaGeometry(section: ParabolaSection, d: number): SectionGeometry {
  const T = section.topWidthFt * Math.sqrt(d / section.depthFt)
  const x = (4 * d) / T
  return {
    areaFt2: (2 / 3) * T * d,
    wettedPerimeterFt: (T / 2) * (Math.sqrt(1 + x ** 2) + Math.asinh(x) / x),
    topWidthFt: T,
  }
}
