import { forWords } from '../../for-words.js'
import { figure, type PartWorking } from './figure.js'

export const pondWorking: PartWorking = ({ partIfReady, input }) => {
  const pond = partIfReady('pond')
  const herd = partIfReady('herd')
  if (!pond || !herd || !input.pond) return []
  const { evaporationInPerDay, seepageInPerDay } = input.pond
  return [
    figure(
      {
        key: 'pond-storage',
        part: 'pond',
        label: 'Water between full pool and the lowest level the ramp serves',
        formula: 'sum of h · (A1 + A2) / 2',
        result: pond.usableFt3,
        unit: 'ft³',
        source: 'FHWA, HEC-22, 4th ed., February 2024, ch. 10 (average end area)',
      },
      [
        ['full pool', pond.fromElevationFt, 'ft'],
        ['lowest level', pond.toElevationFt, 'ft'],
      ],
    ),
    figure(
      {
        key: 'pond-days',
        part: 'pond',
        label: 'Days of water, with no rain and no inflow',
        formula: 'sum of ΔV / (use + (evaporation + seepage) / 12 · mean area)',
        result: pond.daysOfSupply,
        unit: 'days',
        source: 'sum of what leaves the pond; losses as entered in the plan',
      },
      [
        ['use', pond.usePerDayFt3, 'ft³/day'],
        ['evaporation', evaporationInPerDay, 'in/day'],
        ['seepage', seepageInPerDay, 'in/day'],
        ...pond.steps.map(({ fromElevationFt, storageFt3 }) => {
          return [`ΔV below ${forWords(fromElevationFt)} ft`, storageFt3, 'ft³'] as const
        }),
      ],
    ),
  ]
}

export const seedingWorking: PartWorking = ({ partIfReady, input }) => {
  const seeding = partIfReady('seeding')
  const berm = partIfReady('berm')
  if (!seeding || !berm || !input.seeding) return []
  const { extraDisturbedAreaFt2, mulchTonsPerAcre, mix } = input.seeding
  const part = 'seeding'
  const acres = ['acres', seeding.acres, 'acre'] as const
  return [
    figure(
      {
        key: 'seeding-area',
        part,
        label: 'Ground to seed',
        formula: '(sides above the water + berm + other ground) / 43,560',
        result: seeding.acres,
        unit: 'acre',
        source: 'geometry',
      },
      [
        ['sides', seeding.sideSlopesFt2, 'ft²'],
        ['berm', berm.footprintFt2, 'ft²'],
        ['other ground', extraDisturbedAreaFt2, 'ft²'],
      ],
    ),
    ...seeding.mix.map(({ species, bulkLb }, index) =>
      figure(
        {
          key: `seed-${index + 1}`,
          part,
          label: `${species}, seed as bagged`,
          formula: 'pure stand rate · share · acres / (purity · germination)',
          result: bulkLb,
          unit: 'lb',
          source:
            'NRCS Montana, critical area planting job sheet, 2003; rate and seed tag as entered in the plan',
        },
        [
          ['rate', mix[index]?.pureStandLbPlsPerAcre, 'lb/acre'],
          ['share', mix[index]?.sharePercent, '%'],
          ['purity', mix[index]?.purity, ''],
          ['germination', mix[index]?.germination, ''],
          acres,
        ],
      ),
    ),
    figure(
      {
        key: 'mulch',
        part,
        label: 'Mulch',
        formula: 'tons an acre · acres',
        result: seeding.mulchTons,
        unit: 'tons',
        source: 'rate as entered in the plan',
      },
      [['rate', mulchTonsPerAcre, 'tons/acre'], acres],
    ),
  ]
}
