import { Module } from '@nestjs/common'
import { CostListsController } from './cost-lists.controller.js'
import { CostListsService } from './cost-lists.service.js'
import { CriteriaSetsController } from './criteria-sets.controller.js'
import { CriteriaSetsService } from './criteria-sets.service.js'
import { InForceService } from './in-force.service.js'
import { SettingsController } from './settings.controller.js'
import { SettingsService } from './settings.service.js'

@Module({
  controllers: [CostListsController, CriteriaSetsController, SettingsController],
  providers: [CostListsService, CriteriaSetsService, InForceService, SettingsService],
  exports: [CostListsService, CriteriaSetsService, InForceService, SettingsService],
})
export class DistrictsModule {}
