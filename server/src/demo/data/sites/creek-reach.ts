import type { SurveyInput } from 'shared'
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
]

/** Station and depth, ft, waded with a rod. */
const bed: Pair[] = [
  [51, 0],
  [58, 0.9],
  [66, 1.8],
  [74, 2.4],
  [84, 2.7],
  [96, 2.6],
  [106, 1.6],
]

const survey = (levelFt: number): SurveyInput => ({
  kind: 'ground-line',
  waterSurfaceFt: levelFt,
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
  [-218, 32],
  [-218, -94],
  [218, -94],
  [218, 32],
]

/** Four hundred feet of a slow creek, fenced on both banks. Running water is not stored, so there is no pond part. */
export const creekReach = ({ levelFt, headCount, widthFt, gradeRunPerRise, funding }: SiteChoice): DemoSite => ({
  survey: survey(levelFt),
  plan: {
    inputVersion: 1,
    ...usualParts,
    herd: beefHerd(headCount),
    site: {
      body: 'stream',
      fullPoolElevationFt: levelFt,
      lowWaterElevationFt: atLevel(levelFt, -1),
      waterSurfaceTodayFt: levelFt,
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
      laneFromFt: 32,
      panelFromFt: 3,
      panelToFt: -35,
      gateWidthFt: 14,
      laneAreaFt2: 34 * widthFt,
    }),
    runoff: {
      areaAcres: 1.5,
      curveNumber: 72,
      rainfallIn: 4.6,
      rainfallSource: '10-year 24-hour depth, invented for this example',
      returnPeriodYr: 10,
      distribution: 'II',
      flowLengthFt: 380,
      landSlopePercent: 4,
    },
    berm: {
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
      outletSurface: 'sod above the fence',
      outletIsStable: true,
      outletToRampFt: 58,
      soil: 'sand-silt-loam',
      cover: 'good',
    },
    funding,
  },
})
