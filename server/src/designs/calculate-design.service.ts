import { Injectable } from '@nestjs/common'
import { computeDesign, type DesignPlan, type DesignResult, type ResolvedWith } from 'shared'
import type { Tx } from '../platform/database/tx.js'
import { Survey } from '../surveys/survey.entity.js'
import type { FundingOffer } from './funding-offers.js'
import { resolveDesignInput } from './resolve-design-input.js'
import { RulesInForceService } from './rules-in-force.service.js'
import type { RulesInForce } from './rules-in-force.js'

export interface CalculatedDesign {
  result: DesignResult
  resolvedWith: ResolvedWith
  offers: FundingOffer[]
  rules: RulesInForce
}

/** Works a plan out on the ground of its job, by the rules of its district today. Stores nothing. */
@Injectable()
export class CalculateDesignService {
  constructor(private readonly rules: RulesInForceService) {}

  async calculate(tx: Tx, jobId: string, plan: DesignPlan): Promise<CalculatedDesign> {
    const survey = await tx.manager.findOneBy(Survey, { districtId: tx.districtId, jobId })
    const scheduleKeys = (plan.funding?.sources ?? []).map(({ scheduleKey }) => scheduleKey)
    const rules = await this.rules.read(tx, scheduleKeys)
    const { input, resolvedWith, offers } = resolveDesignInput({
      plan,
      groundLine: survey?.groundLine ?? [],
      rules,
    })
    return { result: computeDesign(input), resolvedWith, offers, rules }
  }
}
