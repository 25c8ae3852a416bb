import type { INestApplicationContext, Type } from '@nestjs/common'
import { SessionsService } from '../accounts/sessions.service.js'
import { DesignsService } from '../designs/designs.service.js'
import { CostListsService } from '../districts/cost-lists.service.js'
import { CriteriaSetsService } from '../districts/criteria-sets.service.js'
import { SettingsService } from '../districts/settings.service.js'
import { ActsService } from '../jobs/acts/acts.service.js'
import { CreateJobService } from '../jobs/create-job.service.js'
import { MakePacketService } from '../packets/make-packet.service.js'
import { PageReadingService } from '../packets/page-reading.service.js'
import { RenderPacketService } from '../packets/render-packet.service.js'
import { TechnicalCheckService } from '../packets/technical-check.service.js'
import { UnitOfWork } from '../platform/database/unit-of-work.js'
import { EventLog } from '../platform/events/event-log.service.js'
import { ProducersService } from '../producers/producers.service.js'
import { SchedulesService } from '../schedules/schedules.service.js'
import { SurveysService } from '../surveys/surveys.service.js'

const servicesUsed = {
  work: UnitOfWork,
  events: EventLog,
  sessions: SessionsService,
  settings: SettingsService,
  criteriaSets: CriteriaSetsService,
  costLists: CostListsService,
  schedules: SchedulesService,
  producers: ProducersService,
  jobs: CreateJobService,
  surveys: SurveysService,
  designs: DesignsService,
  packets: MakePacketService,
  renderer: RenderPacketService,
  checks: TechnicalCheckService,
  readings: PageReadingService,
  acts: ActsService,
}

/** The same services that stand behind the routes: what is seeded has passed every guard. */
export type DemoServices = { [Name in keyof typeof servicesUsed]: InstanceType<(typeof servicesUsed)[Name]> }

export function demoServices(app: INestApplicationContext): DemoServices {
  const found = Object.entries(servicesUsed).map(([name, type]) => [
    name,
    app.get(type as Type, { strict: false }),
  ])
  return Object.fromEntries(found) as DemoServices
}
