import { Module } from '@nestjs/common'
import { DistrictsModule } from '../districts/districts.module.js'
import { ScheduleViewsService } from './schedule-views.service.js'
import { SchedulesController } from './schedules.controller.js'
import { SchedulesService } from './schedules.service.js'

@Module({
  imports: [DistrictsModule],
  controllers: [SchedulesController],
  providers: [ScheduleViewsService, SchedulesService],
  exports: [ScheduleViewsService, SchedulesService],
})
export class SchedulesModule {}
