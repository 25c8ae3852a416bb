import { graphicalPeak, type GraphicalPeakInput } from './graphical-peak.js'

/**
 * Peak discharge by the graphical method; `graphicalPeak` gives the working beside it.
 *
 * @returns peak in cfs, 0 when the storm gives no runoff.
 * @throws EngineeringInputError naming the field, also for a site outside the method's limits of use.
 * Source: USDA NRCS, TR-55, Urban Hydrology for Small Watersheds, 2nd ed., June 1986, ch. 4 and appendix F.
 * @example peakDischargeCfs({ method: 'graphical', areaAcres: 250, curveNumber: 75, rainfallIn: 6, timeOfConcentrationHr: 1.53, distribution: 'II' }) // 344.7
 */
export const peakDischargeCfs = (input: GraphicalPeakInput & { method: 'graphical' }): number =>
  graphicalPeak(input).peakCfs
