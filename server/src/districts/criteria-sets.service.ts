import { randomUUID } from 'node:crypto'
import { Injectable } from '@nestjs/common'
import { Problem, type CriteriaSetInput, type CriteriaSetView } from 'shared'
import type { Tx } from '../platform/database/tx.js'
import { EventLog } from '../platform/events/event-log.service.js'
import { CriteriaSet } from './criteria-set.entity.js'
import { criterionProblems } from './criterion-problems.js'
import { InForceService } from './in-force.service.js'

/** What the designs of a district are judged by. */
@Injectable()
export class CriteriaSetsService {
  constructor(
    private readonly inForce: InForceService,
    private readonly events: EventLog,
  ) {}

  /** The newest first. */
  async list(tx: Tx): Promise<CriteriaSetView[]> {
    const sets = await tx.manager.find(CriteriaSet, {
      where: { districtId: tx.districtId },
      order: { createdAt: 'DESC', id: 'ASC' },
    })
    return sets.map(criteriaSetView)
  }

  async create(tx: Tx, input: CriteriaSetInput): Promise<CriteriaSetView> {
    const fields = criterionProblems(input.criteria)
    if (fields.length > 0) throw new Problem('invalid-fields', { fields })
    const set = tx.manager.create(CriteriaSet, {
      ...input,
      districtId: tx.districtId,
      id: randomUUID(),
      status: 'draft',
      version: 1,
      createdAt: tx.at,
    })
    await tx.manager.insert(CriteriaSet, set)
    return criteriaSetView(set)
  }

  /** @throws Problem not-found, already-in-use, or invalid-fields before its first day. */
  async putInForce(tx: Tx, id: string): Promise<CriteriaSetView> {
    const retiredId = await this.inForce.put(tx, { entity: CriteriaSet, noun: 'criteria set', id })
    const set = await tx.manager.findOneByOrFail(CriteriaSet, { districtId: tx.districtId, id })
    const facts = { criteriaSetId: id, version: set.version, retiredId }
    await this.events.append(tx, { streamId: tx.districtId, kind: 'criteria-in-force', facts })
    return criteriaSetView(set)
  }
}

const criteriaSetView = ({
  id,
  name,
  effectiveFrom,
  criteria,
  status,
  version,
}: CriteriaSet): CriteriaSetView => ({ id, name, effectiveFrom, criteria, status, version })
