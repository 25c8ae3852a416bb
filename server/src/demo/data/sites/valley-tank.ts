import type { DesignPlan, SurveyInput } from 'shared'
import { pointsAt, ringFence, type Pair } from './ring-fence.js'
import { atLevel, type DemoSite, type SiteChoice } from './site.js'
import { approachPad, beefHerd, usualParts } from './usual-parts.js'

/** Station and height above full pool, ft. */
const bank: Pair[] = [
  [0, 4.9],
  [18, 4.3],
  [34, 3.4],
  [46, 2.4],
  [53, 1.4],
]

/** Station and depth below today's water, ft, by rod from a boat. */
const bed: Pair[] = [
  [62, 0],
  [74, 1.1],
  [88, 2.3],
  [102, 3.5],
  [118, 4.5],
  [136, 5.3],
  [150, 5.7],
]

const todayBelowFt = 1.1

const survey = (levelFt: number): SurveyInput => ({
  kind: 'ground-line',
  waterSurfaceFt: atLevel(levelFt, -todayBelowFt),
  points: [
    ...bank.map(([stationFt, aboveFt]) => ({ stationFt, elevationFt: atLevel(levelFt, aboveFt) })),
    ...bed.map(([stationFt, waterDepthFt]) => ({ stationFt, waterDepthFt })),
  ],
})

const outline: Pair[] = [
  [-60, 0],
  [60, 0],
  [105, -45],
  [105, -130],
  [55, -180],
  [-55, -180],
  [-105, -130],
  [-105, -45],
]

const round: Pair[] = [
  [-76, 24],
  [-133, -33],
  [-133, -142],
  [-67, -208],
  [67, -208],
  [133, -142],
  [133, -33],
  [76, 24],
]

const runoff: DesignPlan['runoff'] = {
  areaAcres: 2.8,
  curveNumber: 74,
  rainfallIn: 3.9,
  rainfallSource: '10-year 24-hour depth, invented for this example',
  returnPeriodYr: 10,
  distribution: 'II',
  flowLengthFt: 600,
  landSlopePercent: 3.5,
}

const berm: DesignPlan['berm'] = {
  crestStationFt: 20,
  channelGradeFtPerFt: 0.006,
  groundFallFtPerFt: 0.03,
  upslopeRunPerRise: 4,
  downslopeRunPerRise: 4,
  topWidthFt: 4,
  roughnessHigh: 0.12,
  roughnessLow: 0.045,
  minimumHeightFt: 1,
  pastLeftFt: 20,
  pastRightFt: 50,
  falls: 'right',
  outletSurface: 'sod along the fence',
  outletIsStable: true,
  outletToRampFt: 65,
  soil: 'clay',
  cover: 'fair',
}

/** Three feet beyond the toe: the ramp falls 7.25 ft, and its top lies 7 ft landward of the water's edge. */
const panelEndFt = (gradeRunPerRise: number): number => 4 - 7.25 * gradeRunPerRise

/** A small clay tank in a draw, sounded by boat. */
export const valleyTank = ({
  levelFt,
  headCount,
  widthFt,
  gradeRunPerRise,
  funding,
}: SiteChoice): DemoSite => ({
  survey: survey(levelFt),
  plan: {
    inputVersion: 1,
    ...usualParts,
    herd: beefHerd(headCount),
    site: {
      body: 'pond',
      fullPoolElevationFt: levelFt,
      drawdownFt: 4,
      waterSurfaceTodayFt: atLevel(levelFt, -todayBelowFt),
      floodPoolElevationFt: atLevel(levelFt, 1.2),
      topOfDamElevationFt: atLevel(levelFt, 2.3),
      soil: 'clay',
      waterOutline: pointsAt(outline),
    },
    ramp: {
      widthFt,
      gradeRunPerRise,
      topAboveFullPoolFt: 2,
      toeBelowFullPoolFt: 2.5,
      drinkingDepthAtLowWaterFt: 1.25,
    },
    pads: approachPad(widthFt, 12),
    fence: ringFence({
      round,
      rampWidthFt: widthFt,
      laneFromFt: 24,
      panelFromFt: 4,
      panelToFt: panelEndFt(gradeRunPerRise),
      gateWidthFt: 16,
      laneAreaFt2: 28 * widthFt,
    }),
    runoff,
    berm,
    pond: {
      stages: [
        { elevationFt: atLevel(levelFt, -4), areaFt2: 16_400 },
        { elevationFt: atLevel(levelFt, -2), areaFt2: 25_000 },
        { elevationFt: levelFt, areaFt2: 33_275 },
      ],
      evaporationInPerDay: 0.22,
      seepageInPerDay: 0.16,
    },
    funding,
  },
})
