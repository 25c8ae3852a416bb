import { publishedCriteria } from '../src/engineering/checks/published-criteria.js'
import { designInput, type DesignInput, type DesignSetting } from '../src/engineering/design/design-input.js'
import type { FundingSource } from '../src/money/funding/funding-source.js'
import type { DesignPlan } from '../src/schemas/design-plan.js'
import { workedFence, workedOutline } from './worked-fence.js'

/**
 * One constructed pond ramp: site, prices, rates and settings are invented. Its figures were worked out apart from this
 * code, in a second program and partly by hand; they are no published evidence.
 */
export const workedGroundLine = [
  [0, 103.2],
  [20, 102.6],
  [35, 102.1],
  [42, 101.7],
  [46, 101.2],
  [49, 99.6],
  [60, 98.3],
  [72, 97],
  [85, 95.8],
  [100, 94.6],
  [115, 93.7],
  [130, 93.2],
].map(([stationFt = 0, elevationFt = 0]) => ({ stationFt, elevationFt }))

const stone = { thicknessIn: 6, unitWeightTonsPerYd3: 1.35, wastePercent: 5, truckTons: 18 }

export const workedPlan: DesignPlan = {
  inputVersion: 1,
  herd: {
    headCount: 75,
    shareAtOncePercent: 10,
    frontageFtPerHead: 2,
    classes: [{ kind: 'beef-cow', head: 75, weightLb: 1300, milkLb: 25, temperatureF: 90 }],
  },
  site: {
    body: 'pond',
    fullPoolElevationFt: 100,
    lowWaterElevationFt: 96,
    waterSurfaceTodayFt: 98.6,
    waterOutline: workedOutline,
  },
  ramp: {
    widthFt: 18,
    gradeRunPerRise: 8,
    topAboveFullPoolFt: 1.5,
    toeBelowFullPoolFt: 3,
    drinkingDepthAtLowWaterFt: 1.5,
  },
  earthwork: { edgeAllowanceFt: 0, cutSideRunPerRise: 3, fillSideRunPerRise: 3, stationIntervalFt: 10 },
  rock: {
    edgeRunPerRise: 1.5,
    layers: [
      { role: 'surface', name: 'surface stone', stoneSizeIn: 2, ...stone },
      { role: 'base', name: 'base stone', stoneSizeIn: 4, ...stone },
    ],
  },
  fabric: {
    product: '8 oz nonwoven',
    sideTurnUpFt: 1,
    topAnchorFt: 2,
    toeWrapFt: 3,
    rollWidthFt: 15,
    rollLengthFt: 300,
    lapDryFt: 2,
    lapWetFt: 3,
  },
  pads: {
    approach: {
      lengthFt: 10,
      widthFt: 18,
      thicknessIn: 8,
      unitWeightTonsPerYd3: 1.35,
      wastePercent: 5,
      thickenAtRampFt: 0,
    },
  },
  closingPanel: { clearFt: 1, beyondToeFt: 3, aboveWaterFt: 3, postSpacingFt: 10 },
  fence: workedFence,
  runoff: {
    areaAcres: 1.8,
    curveNumber: 79,
    rainfallIn: 4.8,
    rainfallSource: 'invented',
    returnPeriodYr: 10,
    distribution: 'II',
    flowLengthFt: 420,
    landSlopePercent: 5,
    rational: {
      runoffCoefficient: 0.36,
      intensities: [
        { durationMin: 5, intensityInPerHr: 7.2 },
        { durationMin: 10, intensityInPerHr: 5.76 },
      ],
    },
  },
  berm: {
    crestStationFt: 24,
    channelGradeFtPerFt: 0.008,
    groundFallFtPerFt: 1 / 30,
    upslopeRunPerRise: 4,
    downslopeRunPerRise: 4,
    topWidthFt: 4,
    roughnessHigh: 0.1,
    roughnessLow: 0.04,
    minimumHeightFt: 1,
    pastLeftFt: 45,
    pastRightFt: 15,
    falls: 'left',
    outletSurface: 'sod',
    outletIsStable: true,
    outletToRampFt: 45,
    soil: 'sand-silt-loam',
    cover: 'good',
  },
  pond: {
    stages: [
      [96, 46800],
      [97, 51000],
      [98, 55400],
      [99, 60000],
      [100, 64800],
    ].map(([elevationFt = 0, areaFt2 = 0]) => ({ elevationFt, areaFt2 })),
    evaporationInPerDay: 0.25,
    seepageInPerDay: 0.125,
  },
  seeding: {
    // Spoil, pad and what the crew treads down, so that the whole comes to 3,566.47 ft².
    extraDisturbedAreaFt2: 2324.5156,
    mulchTonsPerAcre: 2,
    mix: [
      {
        species: 'tall fescue (example)',
        pureStandLbPlsPerAcre: 20,
        sharePercent: 100,
        purity: 0.97,
        germination: 0.85,
      },
    ],
  },
}

/** Key, typical unit cost, the area's average unit cost. */
const prices = [
  ['excavation-dry', '4.50', '4.00'],
  ['excavation-wet', '9.00', '8.00'],
  ['earth-fill', '5.00', '4.50'],
  ['stone-surface', '31.00', '29.00'],
  ['stone-base', '28.50', '29.00'],
  ['fabric', '1.85', '1.80'],
  ['fabric-pad', '1.85', '1.80'],
  ['fence-electric', '1.95', '1.80'],
  ['closing-panel', '7.50', '6.00'],
  ['gate', '245.00', '230.00'],
  ['energizer-and-grounding', '390.00', '400.00'],
  ['berm', '5.25', '5.00'],
  ['seeding', '620.00', '600.00'],
] as const

export const workedSources: FundingSource[] = [
  {
    key: 'A',
    kind: 'unit-rate',
    lines: [
      { key: 'stone-surface', contractedQuantity: 32, rate: '24.00' },
      { key: 'stone-base', contractedQuantity: 34, rate: '22.00' },
      { key: 'fence-electric', contractedQuantity: 1300, rate: '2.10' },
      { key: 'seeding', contractedQuantity: 0.15, rate: '410.00' },
    ],
    advancePercent: 50,
  },
  {
    key: 'B',
    kind: 'percent-of-cost',
    percent: 75,
    cap: '4500.00',
    averageUnitCosts: Object.fromEntries(prices.map(([key, , average]) => [key, average])),
  },
]

const settings: DesignSetting[] = Object.entries({
  swellPercent: 25,
  shrinkPercent: 10,
  bermFreeboardFt: 0.3,
  bermSettlementPercent: 10,
  spoilSpreadDepthIn: 6,
  toePitMaxFt: 0.5,
  toeHangMaxFt: 0.5,
  bermPastRampMinFt: 10,
}).map(([key, value]) => ({ key, value, source: 'invented' }))

export const workedInput: DesignInput = designInput({
  plan: workedPlan,
  groundLine: workedGroundLine,
  costList: {
    name: 'Invented',
    lines: prices.map(([key, typical]) => ({ key, low: typical, typical, high: typical })),
  },
  sources: workedSources,
  criteria: publishedCriteria,
  settings,
})
