import { Injectable } from '@nestjs/common'
import { Problem, type SurveyInput, type SurveyView } from 'shared'
import { DesignsService } from '../designs/designs.service.js'
import { JobAccessService, type Asking } from '../jobs/job-access.service.js'
import { JobsService } from '../jobs/jobs.service.js'
import type { Tx } from '../platform/database/tx.js'
import { EventLog } from '../platform/events/event-log.service.js'
import { reduceSurvey, type ReducedSurvey } from './reduce-survey.js'
import { surveyProblem } from './survey-problem.js'
import { surveyView } from './survey-view.js'
import { Survey } from './survey.entity.js'

export interface SaveSurvey {
  jobId: string
  /** Which version was seen; 0 before the first. */
  version: number
  survey: SurveyInput
}

/** The measured ground of a job. */
@Injectable()
export class SurveysService {
  constructor(
    private readonly access: JobAccessService,
    private readonly jobs: JobsService,
    private readonly designs: DesignsService,
    private readonly events: EventLog,
  ) {}

  async read(tx: Tx, asking: Asking, jobId: string): Promise<SurveyView> {
    await this.access.find(tx, asking, 'design:read', jobId, 'to-read')
    const survey = await this.load(tx, jobId)
    if (survey === null) throw new Problem('not-found', { detail: 'This job has no survey yet.' })
    return surveyView(survey)
  }

  /** Keeps the notes with what they reduce to, and works every design of the job out on the new ground. */
  async save(tx: Tx, asking: Asking, { jobId, version, survey }: SaveSurvey): Promise<SurveyView> {
    const job = await this.jobs.holdEditable(tx, asking, 'survey:write', jobId)
    const before = await this.load(tx, jobId)
    if ((before?.version ?? 0) !== version) throw staleSurvey(before)
    const saved = tx.manager.create(Survey, {
      districtId: tx.districtId,
      jobId,
      survey,
      ...reducedOrRefused(survey),
      version: version + 1,
      updatedBy: asking.actor.personId,
      updatedAt: tx.at,
    })
    await tx.manager.save(Survey, saved)
    await this.events.append(tx, { streamId: jobId, kind: 'survey-saved', facts: { version: saved.version } })
    await this.designs.recalculate(tx, job)
    return surveyView(saved)
  }

  /** Of a survey that was frozen with a revision. */
  reduce(survey: SurveyInput): ReducedSurvey {
    return reduceSurvey(survey)
  }

  private load(tx: Tx, jobId: string): Promise<Survey | null> {
    return tx.manager.findOneBy(Survey, { districtId: tx.districtId, jobId })
  }
}

function reducedOrRefused(survey: SurveyInput) {
  try {
    return reduceSurvey(survey)
  } catch (error) {
    throw surveyProblem(error, survey.kind)
  }
}

function staleSurvey(before: Survey | null): Problem {
  if (before === null)
    return new Problem('stale-version', { detail: 'This job has no survey yet.', current: null })
  const detail = `Somebody saved version ${before.version} of the survey in between.`
  return new Problem('stale-version', { detail, current: surveyView(before) })
}
