import { randomUUID } from 'node:crypto'
import { Injectable } from '@nestjs/common'
import { Problem, type CostListInput, type CostListView } from 'shared'
import type { Tx } from '../platform/database/tx.js'
import { EventLog } from '../platform/events/event-log.service.js'
import { costLineProblems } from './cost-line-problems.js'
import { CostList } from './cost-list.entity.js'
import { InForceService } from './in-force.service.js'

/** What things cost in a district, low, typical and high. */
@Injectable()
export class CostListsService {
  constructor(
    private readonly inForce: InForceService,
    private readonly events: EventLog,
  ) {}

  /** The newest first. */
  async list(tx: Tx): Promise<CostListView[]> {
    const lists = await tx.manager.find(CostList, {
      where: { districtId: tx.districtId },
      order: { createdAt: 'DESC', id: 'ASC' },
    })
    return lists.map(costListView)
  }

  async create(tx: Tx, input: CostListInput): Promise<CostListView> {
    const fields = costLineProblems(input.lines)
    if (fields.length > 0) throw new Problem('invalid-fields', { fields })
    const list = tx.manager.create(CostList, {
      ...input,
      districtId: tx.districtId,
      id: randomUUID(),
      status: 'draft',
      version: 1,
      createdAt: tx.at,
    })
    await tx.manager.insert(CostList, list)
    return costListView(list)
  }

  /** @throws Problem not-found, already-in-use, or invalid-fields before its first day. */
  async putInForce(tx: Tx, id: string): Promise<CostListView> {
    const retiredId = await this.inForce.put(tx, { entity: CostList, noun: 'cost list', id })
    const list = await tx.manager.findOneByOrFail(CostList, { districtId: tx.districtId, id })
    const facts = { costListId: id, version: list.version, retiredId }
    await this.events.append(tx, { streamId: tx.districtId, kind: 'cost-list-in-force', facts })
    return costListView(list)
  }
}

const costListView = ({
  id,
  name,
  effectiveFrom,
  source,
  lines,
  status,
  version,
}: CostList): CostListView => ({ id, name, effectiveFrom, source, lines, status, version })
