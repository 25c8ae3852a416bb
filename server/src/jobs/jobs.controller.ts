import { Body, Controller, Get, Param, Post, Query } from '@nestjs/common'
import {
  jobInputSchema,
  jobListQuerySchema,
  type EventView,
  type JobInput,
  type JobList,
  type JobListQuery,
  type JobView,
} from 'shared'
import type { Caller } from '../platform/auth/caller.js'
import { Requires } from '../platform/auth/requires.decorator.js'
import { WhoCalls } from '../platform/auth/who-calls.decorator.js'
import { UnitOfWork } from '../platform/database/unit-of-work.js'
import { idParam } from '../platform/web/id-param.js'
import { parsedBy } from '../platform/web/parsed-by.js'
import { CreateJobService } from './create-job.service.js'
import { JobEventsService } from './job-events.service.js'
import { JobListService } from './job-list.service.js'
import { JobViewService } from './job-view.service.js'

@Controller('jobs')
export class JobsController {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly lists: JobListService,
    private readonly creator: CreateJobService,
    private readonly views: JobViewService,
    private readonly events: JobEventsService,
  ) {}

  @Get()
  @Requires('job:list')
  list(
    @WhoCalls() { actor }: Caller,
    @Query(parsedBy(jobListQuerySchema)) query: JobListQuery,
  ): Promise<JobList> {
    return this.unitOfWork.run(actor, (tx) => this.lists.list(tx, query))
  }

  @Post()
  @Requires('job:create')
  create(@WhoCalls() { actor }: Caller, @Body(parsedBy(jobInputSchema)) input: JobInput): Promise<JobView> {
    return this.unitOfWork.run(actor, async (tx) => {
      const job = await this.creator.create(tx, actor.personId, input)
      return this.views.viewOf(tx, actor, job)
    })
  }

  @Get(':id')
  @Requires('job:read')
  read(@WhoCalls() caller: Caller, @Param('id', idParam) id: string): Promise<JobView> {
    return this.unitOfWork.run(caller.actor, (tx) => this.views.read(tx, caller, id))
  }

  @Get(':id/events')
  @Requires('job:read')
  listEvents(@WhoCalls() caller: Caller, @Param('id', idParam) id: string): Promise<EventView[]> {
    return this.unitOfWork.run(caller.actor, (tx) => this.events.list(tx, caller, id))
  }
}
