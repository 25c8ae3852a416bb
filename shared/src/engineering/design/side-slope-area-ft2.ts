import type { RampEarthwork } from '../ramp/ramp-earthwork.js'

interface SideSlopeInput {
  earthwork: Pick<RampEarthwork, 'sections'>
  cutSideRunPerRise: number
  fillSideRunPerRise: number
  /** Ground under water is not seeded. */
  waterSurfaceFt: number
}

type Section = RampEarthwork['sections'][number]

/** Plan area of the cut and fill sides above the water, both sides, which is seeded. Average of two sections by length. */
export function sideSlopeAreaFt2({ earthwork, ...sides }: SideSlopeInput): number {
  return earthwork.sections.slice(1).reduce((sum, to, index) => {
    const from = earthwork.sections[index]
    if (from === undefined) return sum
    const lengthFt = to.stationFt - from.stationFt
    return sum + lengthFt * (drySideFt(from, sides) + drySideFt(to, sides))
  }, 0)
}

/** Level width of one dry side. */
function drySideFt(
  { groundFt, formationFt }: Section,
  { cutSideRunPerRise, fillSideRunPerRise, waterSurfaceFt }: Omit<SideSlopeInput, 'earthwork'>,
): number {
  const highFt = Math.max(groundFt, formationFt)
  const lowFt = Math.max(Math.min(groundFt, formationFt), waterSurfaceFt)
  const runPerRise = groundFt > formationFt ? cutSideRunPerRise : fillSideRunPerRise
  return Math.max(0, highFt - lowFt) * runPerRise
}
