import type { DemoJob } from '../demo-district.js'
import { sableBasinFunding } from './funding.js'
import { producer } from './producers.js'
import { creekReach } from './sites/creek-reach.js'
import { hillPond } from './sites/hill-pond.js'
import { valleyTank } from './sites/valley-tank.js'

const county = 'Tansy'
const funding = sableBasinFunding

const okafor = hillPond({
  levelFt: 1047.2,
  headCount: 52,
  widthFt: 16,
  gradeRunPerRise: 8,
  funding: funding.hillPond,
})
const varga = valleyTank({
  levelFt: 903,
  headCount: 34,
  widthFt: 14,
  gradeRunPerRise: 10,
  funding: funding.valleyTank,
})
const sorrel = creekReach({
  levelFt: 761.4,
  headCount: 46,
  widthFt: 15,
  gradeRunPerRise: 8,
  funding: funding.creekReach,
})

/** Jobs that wait for the landowner, or came back from there. */
export const sableBasinUnderWay: DemoJob[] = [
  {
    job: {
      title: 'Okafor, east pond',
      body: 'pond',
      waterName: 'East pond',
      county,
      farmNumber: '1311',
      tractNumber: '455',
      fieldNumber: '4',
    },
    producer: producer({
      name: 'Samuel Okafor',
      farmName: 'East Pond Farm',
      street: '12 Orchard Turn',
      town: 'Farrow',
      postalCode: '00121',
      phone: '0146',
    }),
    survey: okafor.survey,
    designs: [{ name: 'Ramp by the old gate', plan: okafor.plan }],
    state: 'returned',
    words: 'Please move the gate to the west side. The hay wagon cannot turn at the east corner.',
  },
  {
    job: {
      title: 'Varga, home tank',
      body: 'pond',
      waterName: 'Home tank',
      county,
      farmNumber: '1324',
      tractNumber: '460',
      fieldNumber: '1',
    },
    producer: producer({
      name: 'Ilona Varga',
      farmName: 'Varga Dairy Beef',
      street: '5 Home Tank Road',
      town: 'Quarley',
      postalCode: '00211',
      phone: '0152',
    }),
    survey: varga.survey,
    designs: [{ name: 'Ramp below the barn', plan: varga.plan }],
    state: 'with-landowner',
  },
  {
    job: {
      title: 'Sorrel Creek, lower meadow',
      body: 'stream',
      waterName: 'Sorrel Creek',
      county,
      farmNumber: '1340',
      tractNumber: '471',
      fieldNumber: '9',
    },
    producer: producer({
      name: 'Clement Duvall',
      farmName: 'Lower Meadow Cattle',
      street: '300 Sorrel Creek Road',
      town: 'Farrow',
      postalCode: '00125',
      phone: '0159',
    }),
    survey: sorrel.survey,
    designs: [{ name: 'Ramp at the slow bend', plan: sorrel.plan }],
    state: 'with-landowner',
  },
]
