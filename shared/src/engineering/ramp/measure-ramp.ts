import type { GroundPoint } from '../survey/resolve-ground-line.js'
import type { EarthworkTemplate } from './earthwork-template.js'
import { type MeasuredStretch, measureStretch } from './measure-stretch.js'
import type { SurfacePoint } from './ramp-surface.js'
import { sectionStations } from './section-stations.js'
import { stretches } from './stretches.js'

interface MeasureRampInput {
  groundLine: readonly GroundPoint[]
  surface: readonly SurfacePoint[]
  template: EarthworkTemplate
  intervalFt: number
}

/** All stretches measured; an endless interval leaves only the breaks, which is enough for exact volumes. */
export function measureRamp({
  groundLine,
  surface,
  template,
  intervalFt,
}: MeasureRampInput): MeasuredStretch[] {
  const originFt = surface.find(({ part }) => part === 'ramp')?.stationFt ?? surface[0]?.stationFt ?? 0
  const { waterSurfaceFt } = template
  return stretches({ ...template, groundLine, surface }).map((stretch) => {
    const stations = sectionStations({ stretch, groundLine, waterSurfaceFt, intervalFt, originFt })
    return measureStretch({ stretch, stations, groundLine, template })
  })
}
