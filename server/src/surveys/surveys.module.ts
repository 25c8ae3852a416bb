import { Module } from '@nestjs/common'
import { DesignsModule } from '../designs/designs.module.js'
import { JobsModule } from '../jobs/jobs.module.js'
import { SurveysController } from './surveys.controller.js'
import { SurveysService } from './surveys.service.js'

@Module({
  imports: [DesignsModule, JobsModule],
  controllers: [SurveysController],
  providers: [SurveysService],
  exports: [SurveysService],
})
export class SurveysModule {}
