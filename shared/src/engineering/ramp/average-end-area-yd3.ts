import { EngineeringInputError } from '../engineering-input-error.js'
import { requireNumber } from '../require-number.js'
import { FT3_PER_YD3 } from '../unit-factors.js'

export interface EndAreaSection {
  stationFt: number
  cutAreaFt2: number
  fillAreaFt2: number
}

/**
 * Volumes by average end area: V = L(A1 + A2)/2. Where one section is pure cut and the next pure fill, the zero point
 * splits them: x = L·A1/(A1 + A2), V1 = A1·x/2, V2 = A2(L − x)/2. Otherwise each kind is averaged by itself, so a
 * section without any area tapers over the whole length.
 *
 * @param input.sections 2 or more, stations (ft) strictly ascending, areas ft² ≥ 0.
 * @returns cut and fill, yd³.
 * @throws EngineeringInputError naming the section and field.
 * @see FHWA, HEC-22, Urban Drainage Design Manual, 4th ed., February 2024, chapter 10 (average end area); zero point:
 *   common practice, no source.
 * @example averageEndAreaYd3({ sections: [{ stationFt: 0, cutAreaFt2: 50, fillAreaFt2: 0 },
 *   { stationFt: 50, cutAreaFt2: 150, fillAreaFt2: 0 }] }).cutYd3 // 185.2
 */
export function averageEndAreaYd3({ sections }: { sections: readonly EndAreaSection[] }): {
  cutYd3: number
  fillYd3: number
} {
  const checked = checkedSections(sections)
  let cutFt3 = 0
  let fillFt3 = 0
  checked.slice(1).forEach((right, index) => {
    const left = checked[index] ?? right
    const lengthFt = right.stationFt - left.stationFt
    const span = isZeroPoint(left, right) ? splitAtZero : averaged
    const volume = span({ left, right, lengthFt })
    cutFt3 += volume.cutFt3
    fillFt3 += volume.fillFt3
  })
  return { cutYd3: cutFt3 / FT3_PER_YD3, fillYd3: fillFt3 / FT3_PER_YD3 }
}

interface Span {
  left: EndAreaSection
  right: EndAreaSection
  lengthFt: number
}

const isPureCut = ({ cutAreaFt2, fillAreaFt2 }: EndAreaSection) => cutAreaFt2 > 0 && fillAreaFt2 === 0
const isPureFill = ({ cutAreaFt2, fillAreaFt2 }: EndAreaSection) => fillAreaFt2 > 0 && cutAreaFt2 === 0

function isZeroPoint(left: EndAreaSection, right: EndAreaSection): boolean {
  return (isPureCut(left) && isPureFill(right)) || (isPureFill(left) && isPureCut(right))
}

/** Each kind's triangle has length L · own area / both areas; which of the two sections it starts from does not matter. */
function splitAtZero({ left, right, lengthFt }: Span) {
  const cut = left.cutAreaFt2 + right.cutAreaFt2
  const fill = left.fillAreaFt2 + right.fillAreaFt2
  return {
    cutFt3: (cut * lengthFt * cut) / (cut + fill) / 2,
    fillFt3: (fill * lengthFt * fill) / (cut + fill) / 2,
  }
}

function averaged({ left, right, lengthFt }: Span) {
  return {
    cutFt3: (lengthFt * (left.cutAreaFt2 + right.cutAreaFt2)) / 2,
    fillFt3: (lengthFt * (left.fillAreaFt2 + right.fillAreaFt2)) / 2,
  }
}

function checkedSections(sections: readonly EndAreaSection[]): EndAreaSection[] {
  if (!Array.isArray(sections) || sections.length < 2) {
    throw new EngineeringInputError({ field: 'sections', message: 'A volume needs at least two sections.' })
  }
  return sections.map((section: EndAreaSection, index) => {
    const field = `sections[${index}]`
    const before: number | undefined = sections[index - 1]?.stationFt
    return {
      stationFt: requireNumber({
        field: `${field}.stationFt`,
        value: section.stationFt,
        exclusiveMin: before,
      }),
      cutAreaFt2: requireNumber({ field: `${field}.cutAreaFt2`, value: section.cutAreaFt2, min: 0 }),
      fillAreaFt2: requireNumber({ field: `${field}.fillAreaFt2`, value: section.fillAreaFt2, min: 0 }),
    }
  })
}
