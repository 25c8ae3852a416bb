import { Module } from '@nestjs/common'
import { CreateJobService } from './create-job.service.js'
import { DeskController } from './desk.controller.js'
import { DeskService } from './desk.service.js'
import { JobAccessService } from './job-access.service.js'
import { JobEventsService } from './job-events.service.js'
import { JobFactsService } from './job-facts.service.js'
import { JobListService } from './job-list.service.js'
import { JobViewService } from './job-view.service.js'
import { JobsController } from './jobs.controller.js'
import { JobsService } from './jobs.service.js'
import { ListCursor } from './list-cursor.js'

/** Jobs as they are read. Moving them is the acts' part, which stands on top of all other domains. */
@Module({
  controllers: [DeskController, JobsController],
  providers: [
    CreateJobService,
    DeskService,
    JobAccessService,
    JobEventsService,
    JobFactsService,
    JobListService,
    JobViewService,
    JobsService,
    ListCursor,
  ],
  exports: [CreateJobService, JobAccessService, JobFactsService, JobViewService, JobsService],
})
export class JobsModule {}
