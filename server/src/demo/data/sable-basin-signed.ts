import type { DemoJob } from '../demo-district.js'
import { sableBasinFunding } from './funding.js'
import { producer } from './producers.js'
import { hillPond } from './sites/hill-pond.js'
import { valleyTank } from './sites/valley-tank.js'

const county = 'Tansy'
const funding = sableBasinFunding

const nash = hillPond({
  levelFt: 1126.8,
  headCount: 70,
  widthFt: 17,
  gradeRunPerRise: 9,
  funding: funding.hillPond,
})
const pell = valleyTank({
  levelFt: 842.5,
  headCount: 30,
  widthFt: 13,
  gradeRunPerRise: 9,
  funding: funding.valleyTank,
})
const quist = hillPond({
  levelFt: 1090,
  headCount: 58,
  widthFt: 16,
  gradeRunPerRise: 8,
  funding: funding.hillPond,
})

/** Jobs that the landowner has signed. */
export const sableBasinSigned: DemoJob[] = [
  {
    job: {
      title: 'Nash, summit pond',
      body: 'pond',
      waterName: 'Summit pond',
      county,
      farmNumber: '1408',
      tractNumber: '502',
      fieldNumber: '3',
      legalDescription: 'South half of section 8, Tansy county (example)',
    },
    producer: producer({
      name: 'Beatrix Nash',
      farmName: 'Summit Pond Ranch',
      street: '18 Summit Road',
      town: 'Quarley',
      postalCode: '00215',
      phone: '0163',
    }),
    survey: nash.survey,
    designs: [{ name: 'Ramp on the south bank', plan: nash.plan }],
    state: 'with-supervisor',
  },
  {
    job: {
      title: 'Pell, draw tank',
      body: 'pond',
      waterName: 'Draw tank',
      county,
      farmNumber: '1415',
      tractNumber: '509',
      fieldNumber: '6',
    },
    producer: producer({
      name: 'Horace Pell',
      farmName: 'Pell and Daughters',
      street: '64 Draw Road',
      town: 'Farrow',
      postalCode: '00128',
      phone: '0170',
    }),
    survey: pell.survey,
    designs: [{ name: 'Ramp across from the dam', plan: pell.plan }],
    state: 'approved',
  },
  {
    job: {
      title: 'Quist, school section pond',
      body: 'pond',
      waterName: 'School section pond',
      county,
      farmNumber: '1422',
      tractNumber: '516',
      fieldNumber: '5',
      legalDescription: 'Northeast quarter of section 22, Tansy county (example)',
    },
    producer: producer({
      name: 'Signe Quist',
      farmName: 'Quist Grazing',
      street: '7 School Section Lane',
      town: 'Farrow',
      postalCode: '00131',
      phone: '0178',
    }),
    survey: quist.survey,
    designs: [{ name: 'Ramp on the west bank', plan: quist.plan }],
    state: 'sent',
  },
]
