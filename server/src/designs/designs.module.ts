import { Module } from '@nestjs/common'
import { JobsModule } from '../jobs/jobs.module.js'
import { SchedulesModule } from '../schedules/schedules.module.js'
import { CalculateDesignService } from './calculate-design.service.js'
import { DesignViewsService } from './design-views.service.js'
import { DesignsController } from './designs.controller.js'
import { DesignsService } from './designs.service.js'
import { FreezeDesignService } from './freeze-design.service.js'
import { RulesInForceService } from './rules-in-force.service.js'

@Module({
  imports: [JobsModule, SchedulesModule],
  controllers: [DesignsController],
  providers: [
    CalculateDesignService,
    DesignViewsService,
    DesignsService,
    FreezeDesignService,
    RulesInForceService,
  ],
  exports: [DesignsService, FreezeDesignService],
})
export class DesignsModule {}
