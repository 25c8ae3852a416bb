import { Module, type DynamicModule } from '@nestjs/common'
import { AccountsModule } from './accounts/accounts.module.js'
import { DesignsModule } from './designs/designs.module.js'
import { DistrictsModule } from './districts/districts.module.js'
import { entities } from './entities.js'
import { ActsModule } from './jobs/acts/acts.module.js'
import { JobsModule } from './jobs/jobs.module.js'
import { MailModule } from './mail/mail.module.js'
import { PacketsModule } from './packets/packets.module.js'
import type { Config } from './platform/config/config.js'
import { PlatformModule } from './platform/platform.module.js'
import { ProducersModule } from './producers/producers.module.js'
import { ReviewsModule } from './reviews/reviews.module.js'
import { SchedulesModule } from './schedules/schedules.module.js'
import { SignaturesModule } from './signatures/signatures.module.js'
import { SurveysModule } from './surveys/surveys.module.js'

const domains = [
  AccountsModule,
  DistrictsModule,
  SchedulesModule,
  ProducersModule,
  JobsModule,
  DesignsModule,
  SurveysModule,
  SignaturesModule,
  PacketsModule,
  ReviewsModule,
  MailModule,
  ActsModule,
]

@Module({})
export class AppModule {
  static forRoot(config: Config): DynamicModule {
    return { module: AppModule, imports: [PlatformModule.forRoot(config, entities), ...domains] }
  }
}
