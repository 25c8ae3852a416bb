import type { DemoJob } from '../demo-district.js'
import { producer, producerByPost } from './producers.js'
import { sableBasinFunding } from './funding.js'
import { hillPond } from './sites/hill-pond.js'
import { valleyTank } from './sites/valley-tank.js'

const county = 'Tansy'
const funding = sableBasinFunding

const steep = hillPond({
  levelFt: 984.5,
  headCount: 48,
  widthFt: 15,
  gradeRunPerRise: 4,
  funding: funding.hillPond,
})
const full = hillPond({
  levelFt: 1012,
  headCount: 64,
  widthFt: 17,
  gradeRunPerRise: 8,
  funding: funding.hillPond,
})
const flatter = hillPond({
  levelFt: 1012,
  headCount: 64,
  widthFt: 17,
  gradeRunPerRise: 9,
  funding: funding.hillPond,
})
const tank = valleyTank({
  levelFt: 876,
  headCount: 26,
  widthFt: 13,
  gradeRunPerRise: 10,
  funding: funding.valleyTank,
})

/** Jobs that are still on the planner's desk, and one that went no further. */
export const sableBasinDrafts: DemoJob[] = [
  {
    job: { title: 'Brandvold, calf pasture pond', body: 'pond', waterName: 'Calf pasture pond', county },
    producer: producerByPost({
      name: 'Gunnar Brandvold',
      farmName: 'Brandvold Calf Farm',
      street: '41 Threshold Road',
      town: 'Farrow',
      postalCode: '00113',
      phone: '0113',
    }),
    designs: [],
    state: 'draft',
  },
  {
    job: {
      title: 'Lindquist, steep bank',
      body: 'pond',
      waterName: 'Ridge pond',
      county,
      farmNumber: '1187',
      tractNumber: '402',
      fieldNumber: '2',
    },
    producer: producer({
      name: 'Petra Lindquist',
      farmName: 'Lindquist Hill Farm',
      street: '9 Ridge Pond Lane',
      town: 'Quarley',
      postalCode: '00204',
      phone: '0124',
    }),
    survey: steep.survey,
    designs: [{ name: 'Straight down the bank', plan: steep.plan }],
    state: 'draft',
  },
  {
    job: {
      title: 'Abernethy, two ways down',
      body: 'pond',
      waterName: 'Long pond',
      county,
      farmNumber: '1203',
      tractNumber: '418',
      fieldNumber: '7',
    },
    producer: producer({
      name: 'Rosalind Abernethy',
      farmName: 'Abernethy Pastures',
      street: '230 Long Pond Road',
      town: 'Farrow',
      postalCode: '00117',
      phone: '0131',
    }),
    survey: full.survey,
    designs: [
      { name: '8 : 1', plan: full.plan },
      { name: '9 : 1, longer and flatter', plan: flatter.plan },
    ],
    state: 'draft',
  },
  {
    job: {
      title: 'Hollis, mill draw tank',
      body: 'pond',
      waterName: 'Mill draw tank',
      county,
      farmNumber: '1260',
    },
    producer: producer({
      name: 'Everett Hollis',
      farmName: 'Mill Draw Ranch',
      street: '77 Mill Draw',
      town: 'Quarley',
      postalCode: '00209',
      phone: '0138',
    }),
    survey: tank.survey,
    designs: [{ name: 'Ramp on the north bank', plan: tank.plan }],
    state: 'withdrawn',
    words: 'The family will pipe water to a trough on the ridge instead.',
  },
]
