import { Body, Controller, Get, Param, Post, Put, Query } from '@nestjs/common'
import { lineOrEmpty, producerInputSchema, type ProducerInput, type ProducerView } from 'shared'
import { z } from 'zod'
import type { Caller } from '../platform/auth/caller.js'
import { Requires } from '../platform/auth/requires.decorator.js'
import { WhoCalls } from '../platform/auth/who-calls.decorator.js'
import { UnitOfWork } from '../platform/database/unit-of-work.js'
import { idParam } from '../platform/web/id-param.js'
import { parsedBy } from '../platform/web/parsed-by.js'
import { SeenVersion } from '../platform/web/seen-version.decorator.js'
import { Versioned } from '../platform/web/versioned.js'
import { ProducersService, type VersionedProducer } from './producers.service.js'

const querySchema = z.strictObject({ find: lineOrEmpty(100).default('') })

const answered = ({ version, view }: VersionedProducer) => new Versioned(version, view)

@Controller('producers')
export class ProducersController {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly producers: ProducersService,
  ) {}

  @Get()
  @Requires('producer:read')
  list(
    @WhoCalls() { actor }: Caller,
    @Query(parsedBy(querySchema)) { find }: z.infer<typeof querySchema>,
  ): Promise<ProducerView[]> {
    return this.unitOfWork.run(actor, (tx) => this.producers.list(tx, find))
  }

  @Post()
  @Requires('producer:write')
  async create(
    @WhoCalls() { actor }: Caller,
    @Body(parsedBy(producerInputSchema)) input: ProducerInput,
  ): Promise<Versioned<ProducerView>> {
    return answered(await this.unitOfWork.run(actor, (tx) => this.producers.create(tx, input)))
  }

  @Get(':id')
  @Requires('producer:read')
  async read(
    @WhoCalls() { actor }: Caller,
    @Param('id', idParam) id: string,
  ): Promise<Versioned<ProducerView>> {
    return answered(await this.unitOfWork.run(actor, (tx) => this.producers.read(tx, id)))
  }

  @Put(':id')
  @Requires('producer:write')
  async update(
    @WhoCalls() { actor }: Caller,
    @Param('id', idParam) id: string,
    @SeenVersion() version: number,
    @Body(parsedBy(producerInputSchema)) input: ProducerInput,
  ): Promise<Versioned<ProducerView>> {
    return answered(await this.unitOfWork.run(actor, (tx) => this.producers.update(tx, id, version, input)))
  }
}
