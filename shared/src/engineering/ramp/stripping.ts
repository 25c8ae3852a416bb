import type { EarthSection } from '../design/ramp-shapes.js'
import type { SectionTemplate } from './section-areas.js'
import { FT3_PER_YD3 } from '../unit-factors.js'

export interface Stripping {
  /** Topsoil taken off and stockpiled for seeding, yd³. */
  strippedYd3: number
  /** The part of it that lay within the cut, so that the cut gives that much less fill. */
  fromCutYd3: number
  /** The part of it that lay under the fill, so that the fill needs that much more. */
  underFillYd3: number
}

interface StrippingInput {
  sections: readonly EarthSection[]
  stripDepthFt: number
  template: SectionTemplate
}

/** Strip depth over the footprint of cut and fill wherever the ground stands out of the water. */
export function stripping({ sections, stripDepthFt, template }: StrippingInput): Stripping {
  let cutFt2 = 0
  let fillFt2 = 0
  sections.slice(1).forEach((right, index) => {
    const left = sections[index] ?? right
    // Sections stand wherever the ground meets the water or the formation, so the middle tells for the whole span.
    const isWet = (left.groundFt + right.groundFt) / 2 <= template.waterSurfaceFt
    if (isWet || left.part !== right.part) return
    const depthFt = (left.groundFt - left.formationFt + right.groundFt - right.formationFt) / 2
    const side = depthFt > 0 ? template.cutSideRunPerRise : template.fillSideRunPerRise
    const footprintFt2 =
      (right.stationFt - left.stationFt) * (template.formationWidthFt + 2 * side * Math.abs(depthFt))
    if (depthFt > 0) cutFt2 += footprintFt2
    else fillFt2 += footprintFt2
  })
  const volume = (areaFt2: number) => (areaFt2 * stripDepthFt) / FT3_PER_YD3
  return { strippedYd3: volume(cutFt2 + fillFt2), fromCutYd3: volume(cutFt2), underFillYd3: volume(fillFt2) }
}
