import { randomUUID } from 'node:crypto'
import { isDeepStrictEqual } from 'node:util'
import { Injectable } from '@nestjs/common'
import { Problem, type DesignPlan, type DesignView } from 'shared'
import type { Asking } from '../jobs/job-access.service.js'
import type { Job } from '../jobs/job.entity.js'
import { JobsService, type JobChange } from '../jobs/jobs.service.js'
import type { Tx } from '../platform/database/tx.js'
import { EventLog } from '../platform/events/event-log.service.js'
import { CalculateDesignService } from './calculate-design.service.js'
import { DesignViewsService } from './design-views.service.js'
import { Design } from './design.entity.js'
import { listFigures } from './list-figures.js'
import { upgradePlan } from './upgrade-plan.js'

export interface DesignDraft {
  name: string
  plan: DesignPlan
}

/** Writes the alternatives of a job: what the planner chose, and what followed from it by the rules of that day. */
@Injectable()
export class DesignsService {
  constructor(
    private readonly jobs: JobsService,
    private readonly calculator: CalculateDesignService,
    private readonly views: DesignViewsService,
    private readonly events: EventLog,
  ) {}

  async create(tx: Tx, asking: Asking, jobId: string, draft: DesignDraft): Promise<DesignView> {
    const job = await this.jobs.holdEditable(tx, asking, 'design:write', jobId)
    const begun = { districtId: tx.districtId, id: randomUUID(), jobId: job.id, version: 1, createdAt: tx.at }
    const worked = await this.workedOut(tx, asking, job, draft)
    const design = tx.manager.create(Design, { ...begun, ...worked })
    await tx.manager.insert(Design, design)
    await this.record(tx, 'design-created', design)
    // A job with one alternative has nothing to choose between.
    const isFirst = job.chosenDesignId === null
    await this.jobs.change(tx, job, isFirst ? { chosenDesignId: design.id, ...movedOn(design) } : {})
    return this.views.viewOf(tx, design, job.chosenDesignId)
  }

  /** @throws Problem stale-version with the newer design when somebody saved in between. */
  async update(
    tx: Tx,
    asking: Asking,
    { designId, version, draft }: { designId: string; version: number; draft: DesignDraft },
  ): Promise<DesignView> {
    const { job, design } = await this.hold(tx, asking, designId)
    if (design.version !== version) await this.refuseStale(tx, design, job)
    const worked = await this.workedOut(tx, asking, job, draft)
    if (isSame(design, worked)) return this.views.viewOf(tx, design, job.chosenDesignId)
    const saved = { ...worked, version: design.version + 1 }
    await tx.manager.update(Design, { districtId: tx.districtId, id: design.id }, saved)
    Object.assign(design, saved)
    await this.record(tx, 'design-saved', design)
    await this.jobs.change(tx, job, job.chosenDesignId === design.id ? movedOn(design) : {})
    return this.views.viewOf(tx, design, job.chosenDesignId)
  }

  async choose(tx: Tx, asking: Asking, designId: string): Promise<Job> {
    const { job, design } = await this.hold(tx, asking, designId)
    if (job.chosenDesignId === design.id) return job
    await this.record(tx, 'design-chosen', design)
    return this.jobs.change(tx, job, { chosenDesignId: design.id, ...movedOn(design) })
  }

  /** After the ground under them changed. What the planner chose stays, so no version moves. */
  async recalculate(tx: Tx, job: Job): Promise<void> {
    const designs = await tx.manager.findBy(Design, { districtId: tx.districtId, jobId: job.id })
    let change: JobChange = {}
    for (const design of designs) {
      await this.refresh(tx, design)
      if (design.id === job.chosenDesignId) change = movedOn(design)
    }
    await this.jobs.change(tx, job, change)
  }

  private async refresh(tx: Tx, design: Design): Promise<void> {
    const { result, resolvedWith } = await this.calculator.calculate(
      tx,
      design.jobId,
      upgradePlan(design.plan),
    )
    const worked = { result, resolvedWith, calculationVersion: result.calculationVersion, updatedAt: tx.at }
    await tx.manager.update(Design, { districtId: tx.districtId, id: design.id }, worked)
    Object.assign(design, worked)
  }

  private async workedOut(tx: Tx, { actor }: Asking, job: Job, draft: DesignDraft) {
    const { result, resolvedWith } = await this.calculator.calculate(tx, job.id, draft.plan)
    const calculationVersion = result.calculationVersion
    // Whoever changes a figure is its designer from then on, and so may not check it.
    return {
      ...draft,
      result,
      resolvedWith,
      calculationVersion,
      designerId: actor.personId,
      updatedAt: tx.at,
    }
  }

  /** The job first, so that two savers queue; then the design as it is by then. */
  private async hold(tx: Tx, asking: Asking, designId: string): Promise<{ job: Job; design: Design }> {
    const { jobId } = await this.views.load(tx, designId)
    const job = await this.jobs.holdEditable(tx, asking, 'design:write', jobId)
    return { job, design: await this.views.load(tx, designId) }
  }

  private async refuseStale(tx: Tx, design: Design, job: Job): Promise<never> {
    const current = await this.views.viewOf(tx, design, job.chosenDesignId)
    const detail = `${current.designerName} saved version ${current.version} of "${current.name}" in between.`
    throw new Problem('stale-version', { detail, current })
  }

  private async record(tx: Tx, kind: 'design-created' | 'design-saved' | 'design-chosen', design: Design) {
    const facts = { designId: design.id, version: design.version }
    await this.events.append(tx, { streamId: design.jobId, kind, facts })
  }
}

/** A packet shows the design as it was: once the design moves on, the job has none. */
const movedOn = (design: Design): JobChange => ({ packetId: null, ...listFigures(design) })

/** Nothing moves when the same plan is saved again and still gives the same figures: the packet stays good. */
function isSame(design: Design, worked: DesignDraft & Pick<Design, 'result' | 'resolvedWith'>): boolean {
  const { name, plan, result, resolvedWith } = design
  const stored = { name, plan, result, resolvedWith }
  const posted = {
    name: worked.name,
    plan: worked.plan,
    result: worked.result,
    resolvedWith: worked.resolvedWith,
  }
  return isDeepStrictEqual(stored, JSON.parse(JSON.stringify(posted)))
}
