import { Module } from '@nestjs/common'
import { DesignsModule } from '../designs/designs.module.js'
import { JobsModule } from '../jobs/jobs.module.js'
import { SurveysService } from './surveys.service.js'

@Module({
  imports: [DesignsModule, JobsModule],
  providers: [SurveysService],
  exports: [SurveysService],
})
export class SurveysModule {}
