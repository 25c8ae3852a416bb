import { randomUUID } from 'node:crypto'
import { Injectable } from '@nestjs/common'
import { Brackets } from 'typeorm'
import { Problem, type ProducerInput, type ProducerView } from 'shared'
import { PeopleService } from '../accounts/people.service.js'
import type { Tx } from '../platform/database/tx.js'
import { EventLog } from '../platform/events/event-log.service.js'
import { producerView } from './producer-view.js'
import { Producer } from './producer.entity.js'
import { refuseOtherSigner } from './refuse-other-signer.js'
import { holdOpenJobs } from './signing-jobs.js'

const mostListed = 200

export interface VersionedProducer {
  version: number
  view: ProducerView
}

/** The livestock producers of a district. One with an e-mail is also a person who can read and sign. */
@Injectable()
export class ProducersService {
  constructor(
    private readonly people: PeopleService,
    private readonly events: EventLog,
  ) {}

  /** By name; `find` is looked for in name, farm and e-mail. */
  async list(tx: Tx, find: string): Promise<ProducerView[]> {
    const query = tx.manager
      .createQueryBuilder(Producer, 'p')
      .where('p.districtId = :districtId', { districtId: tx.districtId })
      .orderBy('p.name')
      .addOrderBy('p.id')
      .limit(mostListed)
    if (find.trim() !== '') {
      const pattern = `%${find.trim().replace(/[\\%_]/g, '\\$&')}%`
      query.andWhere(
        new Brackets((any) =>
          any
            .where('p.name ilike :pattern')
            .orWhere('p.farmName ilike :pattern')
            .orWhere('p.email ilike :pattern'),
        ),
        { pattern },
      )
    }
    return (await query.getMany()).map(producerView)
  }

  async read(tx: Tx, id: string): Promise<VersionedProducer> {
    return versioned(await this.load(tx, id))
  }

  async create(tx: Tx, input: ProducerInput): Promise<VersionedProducer> {
    const producer = tx.manager.create(Producer, {
      ...(await this.columnsOf(tx, input)),
      districtId: tx.districtId,
      id: randomUUID(),
      version: 1,
      createdAt: tx.at,
      updatedAt: tx.at,
    })
    await tx.manager.insert(Producer, producer)
    return versioned(producer)
  }

  async update(tx: Tx, id: string, version: number, input: ProducerInput): Promise<VersionedProducer> {
    const before = await this.load(tx, id, 'to-change')
    if (before.version !== version) {
      const detail = `Somebody saved version ${before.version} of ${before.name} in between.`
      throw new Problem('stale-version', { detail, current: producerView(before) })
    }
    const saved = { ...(await this.columnsOf(tx, input)), version: version + 1, updatedAt: tx.at }
    await this.tellJobs(tx, before, saved)
    await tx.manager.update(Producer, { districtId: tx.districtId, id }, saved)
    return versioned(Object.assign(before, saved))
  }

  /** Who signs hangs on the address, so each job that is under way has it in its record. */
  private async tellJobs(
    tx: Tx,
    { id: producerId, personId: before }: Producer,
    { personId, version }: Pick<Producer, 'personId' | 'version'>,
  ): Promise<void> {
    const jobs = await holdOpenJobs(tx, { producerId, personId })
    if (personId !== before) refuseOtherSigner(jobs)
    for (const { jobId } of jobs) {
      const facts = { producerId, version, signerChanged: personId !== before }
      await this.events.append(tx, { streamId: jobId, kind: 'producer-changed', facts })
    }
  }

  /** The whole producer is given each time, so what is left out is taken away. */
  private async columnsOf(tx: Tx, { name, farmName, email, phone, address }: ProducerInput) {
    const personId = email === undefined ? null : await this.people.ensureLandowner(tx, { name, email })
    return { personId, name, farmName, email: email ?? null, phone: phone ?? null, address: address ?? null }
  }

  private async load(tx: Tx, id: string, lock: 'to-read' | 'to-change' = 'to-read'): Promise<Producer> {
    const producer = await tx.manager.findOne(Producer, {
      where: { districtId: tx.districtId, id },
      ...(lock === 'to-change' ? { lock: { mode: 'pessimistic_write' } } : {}),
    })
    if (producer === null) throw new Problem('not-found')
    return producer
  }
}

const versioned = (producer: Producer): VersionedProducer => ({
  version: producer.version,
  view: producerView(producer),
})
