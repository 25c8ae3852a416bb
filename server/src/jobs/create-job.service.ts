import { randomUUID } from 'node:crypto'
import { Injectable } from '@nestjs/common'
import { In } from 'typeorm'
import { Problem, type FieldProblem, type JobInput } from 'shared'
import { District } from '../districts/district.entity.js'
import { civilDateIn } from '../platform/clock/civil-date.js'
import type { Tx } from '../platform/database/tx.js'
import { EventLog } from '../platform/events/event-log.service.js'
import { Producer } from '../producers/producer.entity.js'
import { JobProducer } from './job-producer.entity.js'
import { jobNumber } from './job-number.js'
import { Job } from './job.entity.js'
import { searchText } from './search-text.js'

/** Opens a job as a draft under the district's next number. */
@Injectable()
export class CreateJobService {
  constructor(private readonly events: EventLog) {}

  async create(tx: Tx, createdBy: string, { producerIds, ...input }: JobInput): Promise<Job> {
    const producers = await this.producersOf(tx, producerIds)
    const number = await this.takeNumber(tx)
    const job = tx.manager.create(Job, {
      ...input,
      districtId: tx.districtId,
      id: randomUUID(),
      number,
      state: 'draft',
      version: 1,
      searchText: searchText({ ...input, number, producers }),
      createdBy,
      createdAt: tx.at,
      updatedAt: tx.at,
      stateSince: tx.at,
    })
    await tx.manager.insert(Job, job)
    await tx.manager.insert(
      JobProducer,
      producers.map(({ id }, position) => ({
        districtId: tx.districtId,
        jobId: job.id,
        producerId: id,
        position,
        isSigner: true,
      })),
    )
    const facts = { producerIds: [...producerIds] }
    await this.events.append(tx, { streamId: job.id, kind: 'job-created', facts })
    return tx.manager.findOneByOrFail(Job, { districtId: tx.districtId, id: job.id })
  }

  /** The update holds the district's row until the transaction ends, so two jobs opened at once get two numbers. */
  private async takeNumber(tx: Tx): Promise<string> {
    await tx.manager.increment(District, { id: tx.districtId }, 'nextJobNumber', 1)
    const district = await tx.manager.findOneByOrFail(District, { id: tx.districtId })
    return jobNumber({
      prefix: district.jobNumberPrefix,
      onDate: civilDateIn(district.timeZone, tx.at),
      sequence: district.nextJobNumber - 1,
    })
  }

  private async producersOf(tx: Tx, producerIds: readonly string[]): Promise<Producer[]> {
    const found = await tx.manager.findBy(Producer, { districtId: tx.districtId, id: In([...producerIds]) })
    const byId = new Map(found.map((producer) => [producer.id, producer]))
    const fields = producerIds.flatMap((id, index) => {
      const pointer = `/producerIds/${index}`
      if (!byId.has(id)) return [{ pointer, message: 'This producer is not one of the district.' }]
      const isTwice = producerIds.indexOf(id) !== index
      return isTwice ? [{ pointer, message: 'This producer is named twice.' }] : []
    })
    fields.push(...sharedAddresses(producerIds.flatMap((id) => byId.get(id) ?? [])))
    if (fields.length > 0) throw new Problem('invalid-fields', { fields })
    return producerIds.flatMap((id) => byId.get(id) ?? [])
  }
}

/** Two producers with one address are one person here, who would sign for both. */
function sharedAddresses(producers: readonly Producer[]): FieldProblem[] {
  return producers.flatMap(({ personId, name }, index) => {
    const first = producers.findIndex((other) => other.personId === personId)
    if (personId === null || first === index || producers[first]?.id === producers[index]?.id) return []
    const message = `${name} has the same e-mail as ${producers[first]?.name}. Each signer needs an own address.`
    return [{ pointer: `/producerIds/${index}`, message }]
  })
}
