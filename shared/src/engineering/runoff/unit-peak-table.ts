export type RainfallDistribution = 'I' | 'IA' | 'II' | 'III'

export interface UnitPeakRow {
  /** Initial abstraction over rainfall, 0 to 1. */
  iaOverP: number
  c0: number
  c1: number
  c2: number
}

const row = (iaOverP: number, c0: number, c1: number, c2: number): UnitPeakRow => ({ iaOverP, c0, c1, c2 })

/**
 * Coefficients of log10 qu = C0 + C1 log10 Tc + C2 (log10 Tc)², qu in csm/in, Tc in hours, by rainfall distribution.
 * Source: USDA NRCS, TR-55, Urban Hydrology for Small Watersheds, 2nd ed., June 1986, table F-1.
 */
export const unitPeakTable: Record<RainfallDistribution, readonly UnitPeakRow[]> = {
  I: [
    row(0.1, 2.3055, -0.51429, -0.1175),
    row(0.2, 2.23537, -0.50387, -0.08929),
    row(0.25, 2.18219, -0.48488, -0.06589),
    row(0.3, 2.10624, -0.45695, -0.02835),
    row(0.35, 2.00303, -0.40769, 0.01983),
    row(0.4, 1.87733, -0.32274, 0.05754),
    row(0.45, 1.76312, -0.15644, 0.00453),
    row(0.5, 1.67889, -0.0693, 0),
  ],
  IA: [
    row(0.1, 2.0325, -0.31583, -0.13748),
    row(0.2, 1.91978, -0.28215, -0.0702),
    row(0.25, 1.83842, -0.25543, -0.02597),
    row(0.3, 1.72657, -0.19826, 0.02633),
    row(0.5, 1.63417, -0.091, 0),
  ],
  II: [
    row(0.1, 2.55323, -0.61512, -0.16403),
    row(0.3, 2.46532, -0.62257, -0.11657),
    row(0.35, 2.41896, -0.61594, -0.0882),
    row(0.4, 2.36409, -0.59857, -0.05621),
    row(0.45, 2.29238, -0.57005, -0.02281),
    row(0.5, 2.20282, -0.51599, -0.01259),
  ],
  III: [
    row(0.1, 2.47317, -0.51848, -0.17083),
    row(0.3, 2.39628, -0.51202, -0.13245),
    row(0.35, 2.35477, -0.49735, -0.11985),
    row(0.4, 2.30726, -0.46541, -0.11094),
    row(0.45, 2.24876, -0.41314, -0.11508),
    row(0.5, 2.17772, -0.36803, -0.09525),
  ],
}
