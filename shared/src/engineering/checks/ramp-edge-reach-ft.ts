import type { RampEarthwork } from '../ramp/ramp-earthwork.js'

/**
 * How far rock and side slopes reach beyond the ramp's width on land, each side: half of what the formation is wider,
 * and the run of the cut or fill side at the deepest section landward of the full-pool edge.
 */
export function rampEdgeReachFt(given: {
  earthwork: Pick<RampEarthwork, 'formationWidthFt' | 'sections'>
  fullPoolEdgeStationFt: number
  widthFt: number
  cutSideRunPerRise: number
  fillSideRunPerRise: number
}): number {
  const { earthwork, fullPoolEdgeStationFt, widthFt, cutSideRunPerRise, fillSideRunPerRise } = given
  const onLand = earthwork.sections.filter(({ stationFt }) => stationFt <= fullPoolEdgeStationFt)
  const sideRuns = onLand.map(({ groundFt, formationFt }) => {
    const depthFt = groundFt - formationFt
    return depthFt > 0 ? cutSideRunPerRise * depthFt : -fillSideRunPerRise * depthFt
  })
  return (earthwork.formationWidthFt - widthFt) / 2 + Math.max(0, ...sideRuns)
}
