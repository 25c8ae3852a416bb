import type { INestApplicationContext } from '@nestjs/common'
import { EventRow } from '../platform/events/event.entity.js'
import { castOf, type Cast } from './cast.js'
import { demoDistricts } from './data/demo-districts.js'
import type { DemoDistrict } from './demo-district.js'
import { demoServices, type DemoServices } from './demo-services.js'
import { enterPeople } from './enter-people.js'
import { enterRules } from './enter-rules.js'
import { advanceJob } from './advance-job.js'
import { openJob } from './open-job.js'

export interface Seeding {
  runFolder: string
  hashPassword: (password: string) => Promise<string>
}

/** Stands in the district's own record once its example data is whole: a seeding that was cut short is finished. */
const wholeKind = 'example-data-entered'

/** @returns the one line to say. */
export async function seedDistricts(app: INestApplicationContext, seeding: Seeding): Promise<string> {
  const services = demoServices(app)
  await enterPeople({ work: services.work, districts: demoDistricts, ...seeding })
  let entered = 0
  for (const demo of demoDistricts) {
    const cast = await services.work.runForAccounts((tx) => castOf(tx, demo))
    if (await isWhole(services, cast)) continue
    await seedDistrict(services, cast, demo)
    entered += 1
  }
  return entered === 0 ? 'The example districts are there already.' : `Entered ${entered} example districts.`
}

async function seedDistrict(services: DemoServices, cast: Cast, demo: DemoDistrict): Promise<void> {
  await enterRules(services, cast, demo.rules)
  // One by one, so that the numbers run in the order of the list; the drawing of packets overlaps.
  for (const job of demo.jobs) await openJob(services, cast, job)
  await Promise.all(demo.jobs.map((job) => advanceJob(services, cast, job)))
  const { districtId, administrator } = cast
  await services.work.run(administrator.actor, (tx) =>
    services.events.append(tx, { streamId: districtId, kind: wholeKind, facts: { jobs: demo.jobs.length } }),
  )
}

const isWhole = ({ work }: DemoServices, { districtId, administrator }: Cast): Promise<boolean> =>
  work.run(administrator.actor, ({ manager }) =>
    manager.existsBy(EventRow, { districtId, streamId: districtId, kind: wholeKind }),
  )
