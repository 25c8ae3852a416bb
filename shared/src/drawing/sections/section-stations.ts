import type { EarthSection } from '../../engineering/design/ramp-shapes.js'
import { levelNames } from '../level-names.js'
import { stationLabel } from '../station-label.js'
import type { SheetModel } from '../sheet-model.js'

export interface ChosenSection {
  section: EarthSection
  name: string
}

const MOST = 6
const APART_FT = 2.5

/** The sections that tell the story: both ends, the deepest cut and fill, and where the water stands. */
export function sectionStations(model: SheetModel): ChosenSection[] {
  const sections = (model.earthwork?.sections ?? []).filter(
    ({ part }) => part !== 'approach' && part !== 'end-cut' && part !== 'nose',
  )
  const { profile } = model
  const names = levelNames[model.site.body]
  const nearest = (stationFt: number) =>
    sections.reduce<EarthSection | undefined>(
      (best, section) =>
        !best || Math.abs(section.stationFt - stationFt) < Math.abs(best.stationFt - stationFt)
          ? section
          : best,
      undefined,
    )
  const most = (area: (section: EarthSection) => number) => {
    const best = sections.reduce<EarthSection | undefined>(
      (a, b) => (!a || area(b) > area(a) ? b : a),
      undefined,
    )
    return best && area(best) > 0 ? best : undefined
  }
  const wanted: [string, EarthSection | undefined][] = [
    ['top of the ramp', nearest(profile.topStationFt)],
    ['toe', nearest(profile.toeStationFt)],
    ['most fill', most(({ fillAreaFt2 }) => fillAreaFt2)],
    [`near ${names.high}`, nearest(profile.fullPoolEdgeStationFt)],
    [`near ${names.low}`, nearest(profile.lowWaterEdgeStationFt)],
    ['midway', nearest((profile.topStationFt + profile.toeStationFt) / 2)],
  ]
  const chosen: ChosenSection[] = []
  wanted.forEach(([name, section]) => {
    const isNear = (other: ChosenSection) =>
      section && Math.abs(other.section.stationFt - section.stationFt) < APART_FT
    if (section && chosen.length < MOST && !chosen.some(isNear)) chosen.push({ section, name })
  })
  return chosen.sort((a, b) => a.section.stationFt - b.section.stationFt)
}

export const sectionTitle = ({ section, name }: ChosenSection) =>
  `${stationLabel(section.stationFt)}, ${name}`
