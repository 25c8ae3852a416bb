import type { EarthSection, EarthVolumes } from '../design/ramp-shapes.js'
import { interpolateGround } from '../survey/interpolate-ground.js'
import type { GroundPoint } from '../survey/resolve-ground-line.js'
import { sectionAreas, type SectionAreas, type SectionTemplate } from './section-areas.js'
import { finishedAt } from './finished-at.js'
import type { Stretch } from './stretches.js'
import { FT3_PER_YD3 } from '../unit-factors.js'

export interface MeasureInput {
  stretch: Stretch
  stations: readonly number[]
  groundLine: readonly GroundPoint[]
  template: SectionTemplate
}

export interface MeasuredStretch {
  stretch: Stretch
  sections: EarthSection[]
  averageEndArea: EarthVolumes
  prismoidal: EarthVolumes
}

/** Sections of one stretch, and its volumes both ways. */
export function measureStretch(input: MeasureInput): MeasuredStretch {
  const sections = input.stations.map((stationFt) => sectionAt(input, stationFt))
  const spans = sections.slice(1).map((right, index) => {
    const left = sections[index] ?? right
    // The mean of two straight lines is the line's own middle, so this is the section of the mean dimensions.
    return { left, right, middle: sectionAt(input, (left.stationFt + right.stationFt) / 2) }
  })
  const sum = (area: keyof SectionAreas, weigh: (left: number, middle: number, right: number) => number) =>
    spans.reduce((total, { left, middle, right }) => {
      const lengthFt = right.stationFt - left.stationFt
      return total + lengthFt * weigh(left[area], middle[area], right[area])
    }, 0) / FT3_PER_YD3
  return {
    stretch: input.stretch,
    sections,
    averageEndArea: volumes((area) => sum(area, (left, _middle, right) => (left + right) / 2)),
    prismoidal: volumes((area) => sum(area, (left, middle, right) => (left + 4 * middle + right) / 6)),
  }
}

function volumes(sum: (area: keyof SectionAreas) => number): EarthVolumes {
  const cutYd3 = sum('cutAreaFt2')
  const wetCutYd3 = sum('wetCutAreaFt2')
  return {
    cutYd3,
    fillYd3: sum('fillAreaFt2'),
    wetCutYd3,
    dryCutYd3: cutYd3 - wetCutYd3,
    wetFillYd3: sum('wetFillAreaFt2'),
    edgeBackfillYd3: sum('edgeBackfillAreaFt2'),
  }
}

function sectionAt({ stretch, groundLine, template }: MeasureInput, stationFt: number): EarthSection {
  const groundFt = interpolateGround(groundLine, stationFt)
  const finishedFt = finishedAt(stretch, stationFt)
  const formationFt = finishedFt - stretch.rockFt
  const areas = sectionAreas({ groundFt, formationFt, rockFt: stretch.rockFt, template })
  return { stationFt, part: stretch.part, groundFt, finishedFt, formationFt, ...areas }
}
