import type { DemoJob } from '../demo-district.js'
import { corrowForkFunding } from './funding.js'
import { producer } from './producers.js'
import { creekReach } from './sites/creek-reach.js'
import { hillPond } from './sites/hill-pond.js'
import { valleyTank } from './sites/valley-tank.js'

const county = 'Vesper'
const funding = corrowForkFunding

const cutler = creekReach({
  levelFt: 4210,
  headCount: 40,
  widthFt: 14,
  gradeRunPerRise: 9,
  funding: funding.creekReach,
})
const ames = valleyTank({
  levelFt: 4388.2,
  headCount: 32,
  widthFt: 14,
  gradeRunPerRise: 9,
  funding: funding.valleyTank,
})
const thorne = hillPond({
  levelFt: 4466,
  headCount: 55,
  widthFt: 16,
  gradeRunPerRise: 8,
  funding: funding.hillPond,
})

export const corrowForkJobs: DemoJob[] = [
  {
    job: {
      title: 'Cutler, fork crossing',
      body: 'stream',
      waterName: 'Corrow Fork',
      county,
      farmNumber: '88',
    },
    producer: producer({
      name: 'Amos Cutler',
      farmName: 'Crossing Ranch',
      street: '2 Fork Road',
      town: 'Merrow',
      postalCode: '00702',
      phone: '0184',
    }),
    survey: cutler.survey,
    designs: [{ name: 'Ramp above the crossing', plan: cutler.plan }],
    state: 'draft',
  },
  {
    job: {
      title: 'Ames, windbreak tank',
      body: 'pond',
      waterName: 'Windbreak tank',
      county,
      farmNumber: '93',
      tractNumber: '12',
    },
    producer: producer({
      name: 'Lettie Ames',
      farmName: 'Windbreak Cattle',
      street: '51 Section Road',
      town: 'Merrow',
      postalCode: '00705',
      phone: '0189',
    }),
    survey: ames.survey,
    designs: [{ name: 'Ramp in the lee', plan: ames.plan }],
    state: 'with-landowner',
  },
  {
    job: {
      title: 'Thorne, bench pond',
      body: 'pond',
      waterName: 'Bench pond',
      county,
      farmNumber: '97',
      tractNumber: '15',
    },
    producer: producer({
      name: 'Jasper Thorne',
      farmName: 'Bench Land and Cattle',
      street: '120 Bench Road',
      town: 'Merrow',
      postalCode: '00709',
      phone: '0195',
    }),
    survey: thorne.survey,
    designs: [{ name: 'Ramp on the bench', plan: thorne.plan }],
    state: 'with-supervisor',
  },
]
