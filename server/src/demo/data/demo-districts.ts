import type { DemoDistrict } from '../demo-district.js'
import { corrowForkJobs } from './corrow-fork-jobs.js'
import { corrowForkSettings, sableBasinSettings } from './district-settings.js'
import { corrowForkSchedules, sableBasinSchedules } from './payment-schedules.js'
import { corrowForkPeople, sableBasinPeople } from './people.js'
import { sableBasinDrafts } from './sable-basin-drafts.js'
import { sableBasinSigned } from './sable-basin-signed.js'
import { sableBasinUnderWay } from './sable-basin-under-way.js'
import { corrowForkCosts, sableBasinCosts } from './unit-costs.js'

/** Both are invented, with everybody and everything in them; two, so that it can be seen that they stay apart. */
export const demoDistricts: readonly DemoDistrict[] = [
  {
    name: 'Sable Basin Conservation District (example)',
    timeZone: 'America/Chicago',
    fiscalYearStartMonth: 10,
    jobNumberPrefix: 'SB',
    people: sableBasinPeople,
    rules: { settings: sableBasinSettings, costList: sableBasinCosts, schedules: sableBasinSchedules },
    jobs: [...sableBasinDrafts, ...sableBasinUnderWay, ...sableBasinSigned],
  },
  {
    name: 'Corrow Fork Conservation District (example)',
    timeZone: 'America/Denver',
    fiscalYearStartMonth: 7,
    jobNumberPrefix: 'CF',
    people: corrowForkPeople,
    rules: { settings: corrowForkSettings, costList: corrowForkCosts, schedules: corrowForkSchedules },
    jobs: corrowForkJobs,
  },
]
