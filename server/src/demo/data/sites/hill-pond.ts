import type { DesignPlan, LevelNoteRow, SurveyInput } from 'shared'
import { pointsAt, ringFence, type Pair } from './ring-fence.js'
import { atLevel, type DemoSite, type SiteChoice } from './site.js'
import { approachPad, beefHerd, usualParts } from './usual-parts.js'

const sight = (label: string, stationFt: number, intermediateFt: number): LevelNoteRow => ({
  label,
  stationFt,
  intermediateFt,
})

/** A silt loam bank with an undercut edge. The readings do not depend on the height above the sea. */
const rows: LevelNoteRow[] = [
  { label: 'Spike in corner post', backsightFt: 3.9 },
  sight('0+00', 0, 4.9),
  sight('0+22', 22, 5.6),
  sight('0+36', 36, 6.2),
  sight('0+44', 44, 6.8),
  sight('0+48', 48, 7.4),
  { label: 'TP-1', stationFt: 51, backsightFt: 3.3, foresightFt: 9 },
  sight('0+62', 62, 4.4),
  sight('0+75', 75, 5.7),
  sight('0+88', 88, 6.8),
  sight('1+02', 102, 7.9),
  sight('1+18', 118, 8.8),
  sight('1+32', 132, 9.3),
  { label: 'Water edge today', intermediateFt: 4 },
  { label: 'TP-2', backsightFt: 7.7, foresightFt: 2.1 },
  { label: 'Spike in corner post (close)', foresightFt: 3.79 },
]

const outline: Pair[] = [
  [-80, 0],
  [80, 0],
  [135, -55],
  [135, -165],
  [80, -220],
  [-80, -220],
  [-135, -165],
  [-135, -55],
]

const round: Pair[] = [
  [-104, 18],
  [-165, -43],
  [-165, -177],
  [-92, -250],
  [92, -250],
  [165, -177],
  [165, -43],
  [104, 18],
]

const survey = (levelFt: number): SurveyInput => {
  const benchMarkFt = atLevel(levelFt, 4.6)
  return {
    kind: 'level-notes',
    startElevationFt: benchMarkFt,
    waterSurfaceFt: atLevel(levelFt, -1.2),
    closing: { knownElevationFt: benchMarkFt, lengthMiles: 0.06, coefficientFt: 0.1 },
    rows,
  }
}

const runoff: DesignPlan['runoff'] = {
  areaAcres: 2.1,
  curveNumber: 77,
  rainfallIn: 4.6,
  rainfallSource: '10-year 24-hour depth, invented for this example',
  returnPeriodYr: 10,
  distribution: 'II',
  flowLengthFt: 460,
  landSlopePercent: 5,
}

const berm: DesignPlan['berm'] = {
  crestStationFt: 20,
  channelGradeFtPerFt: 0.008,
  groundFallFtPerFt: 0.032,
  upslopeRunPerRise: 4,
  downslopeRunPerRise: 4,
  topWidthFt: 4,
  roughnessHigh: 0.1,
  roughnessLow: 0.04,
  minimumHeightFt: 1,
  pastLeftFt: 45,
  pastRightFt: 16,
  falls: 'left',
  outletSurface: 'sod along the fence',
  outletIsStable: true,
  outletToRampFt: 60,
  soil: 'sand-silt-loam',
  cover: 'good',
}

/** Three feet beyond the toe: the ramp falls 7 ft, and its top lies 5 ft landward of the water's edge. */
const panelEndFt = (gradeRunPerRise: number): number => 2 - 7 * gradeRunPerRise

/** A pond of an acre and a quarter below a grassed hillside. */
export const hillPond = ({
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
      lowWaterElevationFt: atLevel(levelFt, -4),
      waterSurfaceTodayFt: atLevel(levelFt, -1.2),
      floodPoolElevationFt: atLevel(levelFt, 1),
      topOfDamElevationFt: atLevel(levelFt, 2.4),
      soil: 'silt loam',
      waterOutline: pointsAt(outline),
    },
    ramp: {
      widthFt,
      gradeRunPerRise,
      topAboveFullPoolFt: 1.5,
      toeBelowFullPoolFt: 3,
      drinkingDepthAtLowWaterFt: 1.5,
    },
    pads: approachPad(widthFt, 10),
    fence: ringFence({
      round,
      rampWidthFt: widthFt,
      laneFromFt: 18,
      panelFromFt: 3,
      panelToFt: panelEndFt(gradeRunPerRise),
      gateWidthFt: 14,
      laneAreaFt2: 22 * widthFt,
    }),
    runoff,
    berm,
    pond: {
      stages: [
        { elevationFt: atLevel(levelFt, -4), areaFt2: 37_500 },
        { elevationFt: atLevel(levelFt, -2), areaFt2: 45_200 },
        { elevationFt: levelFt, areaFt2: 53_350 },
      ],
      evaporationInPerDay: 0.24,
      seepageInPerDay: 0.12,
    },
    funding,
  },
})
