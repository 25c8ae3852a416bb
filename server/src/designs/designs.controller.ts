import { Body, Controller, Get, HttpCode, Param, Post, Put } from '@nestjs/common'
import {
  designInputSchema,
  designPlanSchema,
  type DesignPlan,
  type DesignResult,
  type DesignView,
  type JobView,
  type ResolvedWith,
} from 'shared'
import { JobAccessService } from '../jobs/job-access.service.js'
import { JobViewService } from '../jobs/job-view.service.js'
import type { Caller } from '../platform/auth/caller.js'
import { Requires } from '../platform/auth/requires.decorator.js'
import { WhoCalls } from '../platform/auth/who-calls.decorator.js'
import { UnitOfWork } from '../platform/database/unit-of-work.js'
import { idParam } from '../platform/web/id-param.js'
import { parsedBy } from '../platform/web/parsed-by.js'
import { SeenVersion } from '../platform/web/seen-version.decorator.js'
import { CalculateDesignService } from './calculate-design.service.js'
import { DesignViewsService } from './design-views.service.js'
import { DesignsService, type DesignDraft } from './designs.service.js'

@Controller()
export class DesignsController {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly access: JobAccessService,
    private readonly jobViews: JobViewService,
    private readonly designs: DesignsService,
    private readonly views: DesignViewsService,
    private readonly calculator: CalculateDesignService,
  ) {}

  @Get('jobs/:id/designs')
  @Requires('design:read')
  list(@WhoCalls() caller: Caller, @Param('id', idParam) jobId: string): Promise<DesignView[]> {
    return this.unitOfWork.run(caller.actor, (tx) => this.views.list(tx, caller, jobId))
  }

  @Post('jobs/:id/designs')
  @Requires('design:write')
  create(
    @WhoCalls() caller: Caller,
    @Param('id', idParam) jobId: string,
    @Body(parsedBy(designInputSchema)) draft: DesignDraft,
  ): Promise<DesignView> {
    return this.unitOfWork.run(caller.actor, (tx) => this.designs.create(tx, caller, jobId, draft))
  }

  /** Works a plan out for the form and stores nothing. */
  @Post('jobs/:id/calculate')
  @HttpCode(200)
  @Requires('design:read')
  calculate(
    @WhoCalls() caller: Caller,
    @Param('id', idParam) jobId: string,
    @Body(parsedBy(designPlanSchema)) plan: DesignPlan,
  ): Promise<{ result: DesignResult; resolvedWith: ResolvedWith }> {
    return this.unitOfWork.run(caller.actor, async (tx) => {
      await this.access.find(tx, caller, 'design:read', jobId, 'to-read')
      const { result, resolvedWith } = await this.calculator.calculate(tx, jobId, plan)
      return { result, resolvedWith }
    })
  }

  @Get('designs/:id')
  @Requires('design:read')
  read(@WhoCalls() caller: Caller, @Param('id', idParam) designId: string): Promise<DesignView> {
    return this.unitOfWork.run(caller.actor, (tx) => this.views.read(tx, caller, designId))
  }

  @Put('designs/:id')
  @Requires('design:write')
  update(
    @WhoCalls() caller: Caller,
    @Param('id', idParam) designId: string,
    @SeenVersion() version: number,
    @Body(parsedBy(designInputSchema)) draft: DesignDraft,
  ): Promise<DesignView> {
    return this.unitOfWork.run(caller.actor, (tx) =>
      this.designs.update(tx, caller, { designId, version, draft }),
    )
  }

  @Post('designs/:id/choose')
  @HttpCode(200)
  @Requires('design:write')
  choose(@WhoCalls() caller: Caller, @Param('id', idParam) designId: string): Promise<JobView> {
    return this.unitOfWork.run(caller.actor, async (tx) => {
      const job = await this.designs.choose(tx, caller, designId)
      return this.jobViews.viewOf(tx, caller.actor, job)
    })
  }
}
