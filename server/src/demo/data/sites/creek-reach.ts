import type { DesignPlan, SurveyInput } from 'shared'
import { pointsAt, ringFence, type Pair } from './ring-fence.js'
import { atLevel, type DemoSite, type SiteChoice } from './site.js'
import { approachPad, beefHerd, usualParts } from './usual-parts.js'

/** Station and height above the ordinary level, ft. */
const bank: Pair[] = [
  [0, 3.6],
  [20, 3.3],
  [34, 2.8],
  [42, 2.1],
  [47, 1.2],
  [51, 0],
]

/** Station and depth below today's water, ft, waded with a rod in a dry week. */
const bed: Pair[] = [
  [56, 0],
  [66, 1.2],
  [74, 1.8],
  [84, 2.1],
  [96, 2],
  [106, 1],
]

const todayBelowFt = 0.6

const survey = (levelFt: number): SurveyInput => ({
  kind: 'ground-line',
  waterSurfaceFt: atLevel(levelFt, -todayBelowFt),
  points: [
    ...bank.map(([stationFt, aboveFt]) => ({ stationFt, elevationFt: atLevel(levelFt, aboveFt) })),
    ...bed.map(([stationFt, waterDepthFt]) => ({ stationFt, waterDepthFt })),
  ],
})

const outline: Pair[] = [
  [-190, 0],
  [190, 0],
  [190, -62],
  [-190, -62],
]

const round: Pair[] = [
  [-218, 20],
  [-218, -94],
  [218, -94],
  [218, 20],
]

const runoff: DesignPlan['runoff'] = {
  areaAcres: 1.5,
  curveNumber: 72,
  rainfallIn: 4.6,
  rainfallSource: '10-year 24-hour depth, invented for this example',
  returnPeriodYr: 10,
  distribution: 'II',
  flowLengthFt: 380,
  landSlopePercent: 4,
}

const berm: DesignPlan['berm'] = {
  crestStationFt: 18,
  channelGradeFtPerFt: 0.007,
  groundFallFtPerFt: 0.025,
  upslopeRunPerRise: 4,
  downslopeRunPerRise: 4,
  topWidthFt: 4,
  roughnessHigh: 0.1,
  roughnessLow: 0.04,
  minimumHeightFt: 1,
  pastLeftFt: 16,
  pastRightFt: 45,
  falls: 'right',
  outletSurface: 'sod along the fence',
  outletIsStable: true,
  outletToRampFt: 58,
  soil: 'sand-silt-loam',
  cover: 'good',
}

/** Three feet beyond the toe: the ramp falls 3.75 ft, and its top lies 6 ft landward of the water's edge. */
const panelEndFt = (gradeRunPerRise: number): number => 3 - 3.75 * gradeRunPerRise

/** Four hundred feet of a slow creek, fenced on both banks. Running water is not stored, so there is no pond part. */
export const creekReach = ({
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
      body: 'stream',
      fullPoolElevationFt: levelFt,
      lowWaterElevationFt: atLevel(levelFt, -1),
      waterSurfaceTodayFt: atLevel(levelFt, -todayBelowFt),
      floodPoolElevationFt: atLevel(levelFt, 1),
      soil: 'sandy loam over gravel',
      waterOutline: pointsAt(outline),
    },
    ramp: {
      widthFt,
      gradeRunPerRise,
      topAboveFullPoolFt: 1.5,
      toeBelowFullPoolFt: 2,
      drinkingDepthAtLowWaterFt: 1.25,
    },
    pads: approachPad(widthFt, 10),
    fence: ringFence({
      round,
      rampWidthFt: widthFt,
      laneFromFt: 20,
      panelFromFt: 3,
      panelToFt: panelEndFt(gradeRunPerRise),
      gateWidthFt: 14,
      laneAreaFt2: 24 * widthFt,
    }),
    runoff,
    berm,
    funding,
  },
})
