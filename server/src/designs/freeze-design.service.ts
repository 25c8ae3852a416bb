import { randomUUID } from 'node:crypto'
import { Injectable } from '@nestjs/common'
import { Problem, type SettingValue, type SurveyInput } from 'shared'
import { JobAccessService } from '../jobs/job-access.service.js'
import type { Job } from '../jobs/job.entity.js'
import { JobsService } from '../jobs/jobs.service.js'
import type { Tx } from '../platform/database/tx.js'
import { EventLog } from '../platform/events/event-log.service.js'
import { Survey } from '../surveys/survey.entity.js'
import { CalculateDesignService } from './calculate-design.service.js'
import { Design } from './design.entity.js'
import { listFigures } from './list-figures.js'
import { refuseEmptySettings, refuseIncomplete, refuseUnmapped } from './refuse-unready.js'
import { Revision } from './revision.entity.js'
import type { RulesInForce } from './rules-in-force.js'
import { upgradePlan } from './upgrade-plan.js'

/** Freezes a design for a packet: from then on nobody can change what the packet shows. */
@Injectable()
export class FreezeDesignService {
  constructor(
    private readonly access: JobAccessService,
    private readonly jobs: JobsService,
    private readonly calculator: CalculateDesignService,
    private readonly events: EventLog,
  ) {}

  /**
   * Works the chosen design out once more, by the rules in force now, and keeps it as the job's next revision.
   * The job is left without a packet; whoever makes one for the revision enters it.
   *
   * @throws Problem transition-not-allowed, setting-missing, schedule-not-mapped or design-incomplete.
   */
  async freeze(tx: Tx, jobId: string, designId: string): Promise<Revision> {
    const job = await this.access.load(tx, jobId, 'to-change')
    this.jobs.requireEditable(job)
    const design = await this.chosenDesign(tx, job, designId)
    const survey = await this.surveyOf(tx, jobId)
    const plan = upgradePlan(design.plan)
    const { result, resolvedWith, rules, offers } = await this.calculator.calculate(tx, jobId, plan)
    refuseEmptySettings(rules)
    refuseUnmapped(offers)
    refuseIncomplete(result, rules)
    const worked = { result, resolvedWith, calculationVersion: result.calculationVersion }
    await tx.manager.update(Design, { districtId: tx.districtId, id: design.id }, worked)
    const revision = tx.manager.create(Revision, {
      districtId: tx.districtId,
      id: randomUUID(),
      jobId,
      designId,
      designVersion: design.version,
      number: await this.nextNumber(tx, jobId),
      survey,
      plan,
      result,
      calculationVersion: result.calculationVersion,
      criteriaSetId: resolvedWith.criteriaSet?.id ?? null,
      costListId: resolvedWith.costList?.id ?? null,
      scheduleIds: resolvedWith.schedules.map(({ id }) => id),
      settings: enteredSettings(rules),
      designerId: design.designerId,
      madeBy: tx.personId ?? design.designerId,
      madeAt: tx.at,
    })
    await tx.manager.insert(Revision, revision)
    await this.jobs.change(tx, job, { packetId: null, ...listFigures({ plan, result }) })
    const facts = { designId, revision: revision.number, revisionId: revision.id }
    await this.events.append(tx, { streamId: jobId, kind: 'revision-frozen', facts })
    return revision
  }

  private async chosenDesign(tx: Tx, job: Job, designId: string): Promise<Design> {
    const design = await tx.manager.findOneBy(Design, {
      districtId: tx.districtId,
      id: designId,
      jobId: job.id,
    })
    if (design === null) {
      const message = 'This design is not one of the job.'
      throw new Problem('invalid-fields', { fields: [{ pointer: '/designId', message }] })
    }
    if (job.chosenDesignId !== design.id) {
      const reason = `The design "${design.name}" is not the chosen one. Choose it first.`
      throw new Problem('transition-not-allowed', { detail: reason, reasons: [reason] })
    }
    return design
  }

  private async surveyOf(tx: Tx, jobId: string): Promise<SurveyInput> {
    const survey = await tx.manager.findOneBy(Survey, { districtId: tx.districtId, jobId })
    if (survey !== null) return survey.survey
    const message = 'The bank has not been surveyed yet. Enter the level notes or a ground line.'
    throw new Problem('design-incomplete', { detail: message, fields: [{ pointer: '/survey', message }] })
  }

  /** The job's row is held, so no other revision can take the same number. */
  private async nextNumber(tx: Tx, jobId: string): Promise<number> {
    return ((await tx.manager.maximum(Revision, 'number', { districtId: tx.districtId, jobId })) ?? 0) + 1
  }
}

const enteredSettings = ({ settings }: RulesInForce): SettingValue[] =>
  settings
    .filter(({ value }) => value !== null)
    .map(({ key, value, source, sourceDate }) => ({ key, value, source, sourceDate }))
