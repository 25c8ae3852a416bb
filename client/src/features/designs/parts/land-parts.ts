import { number, text } from '../field-specs'
import type { PartSpec } from '../part-spec'

export const pondPart: PartSpec = {
  part: 'pond',
  title: 'Pond',
  sentence: 'The area of the water by level, and what is lost in a day. It gives the days of supply.',
  items: [
    {
      kind: 'list',
      name: 'stages',
      isCompact: true,
      title: 'Area by level',
      one: 'level',
      hint: 'From the lowest up',
      empty: {},
      isOrdered: true,
      items: [number('elevationFt', 'Elevation', 'ft'), number('areaFt2', 'Area', 'ft²')],
    },
    number('evaporationInPerDay', 'Evaporation', 'in a day'),
    number('seepageInPerDay', 'Seepage', 'in a day'),
  ],
  start: () => ({ stages: [{}, {}] }),
  results: ['pond'],
}

export const seedingPart: PartSpec = {
  part: 'seeding',
  title: 'Seeding',
  sentence: 'What is sown on the ground that the work lays bare.',
  items: [
    number('extraDisturbedAreaFt2', 'Bare ground besides ramp and berm', 'ft²'),
    number('mulchTonsPerAcre', 'Mulch', 'tons an acre'),
    {
      kind: 'list',
      name: 'mix',
      title: 'Seed mix',
      one: 'species',
      hint: 'Rates are of pure live seed, for a stand of that species alone.',
      empty: {},
      items: [
        text('species', 'Species'),
        number('pureStandLbPlsPerAcre', 'Rate alone', 'lb an acre'),
        number('sharePercent', 'Share of the mix', '%'),
        number('purity', 'Purity', undefined, { hint: 'Such as 0.97' }),
        number('germination', 'Germination', undefined, { hint: 'Such as 0.85' }),
      ],
    },
  ],
  start: () => ({ mix: [{}] }),
  results: ['seeding'],
}
