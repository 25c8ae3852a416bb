import { Body, Controller, HttpCode, Param, Post } from '@nestjs/common'
import { consentSchema, readPageSchema, technicalCheckSchema, type PacketView } from 'shared'
import type { z } from 'zod'
import type { Caller } from '../platform/auth/caller.js'
import { Requires } from '../platform/auth/requires.decorator.js'
import { WhoCalls } from '../platform/auth/who-calls.decorator.js'
import { UnitOfWork } from '../platform/database/unit-of-work.js'
import { Intended, type Intention } from '../platform/idempotency/intended.decorator.js'
import { OnceService } from '../platform/idempotency/once.service.js'
import { idParam } from '../platform/web/id-param.js'
import { parsedBy } from '../platform/web/parsed-by.js'
import { PacketViewService } from './packet-view.service.js'
import { PageReadingService } from './page-reading.service.js'
import { TechnicalCheckService } from './technical-check.service.js'

/** What people do with a packet that does not move the job. */
@Controller('packets/:id')
export class PacketActsController {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly once: OnceService,
    private readonly checks: TechnicalCheckService,
    private readonly readings: PageReadingService,
    private readonly views: PacketViewService,
  ) {}

  @Post('technical-check')
  @HttpCode(200)
  @Requires('packet:check')
  check(
    @WhoCalls() caller: Caller,
    @Param('id', idParam) packetId: string,
    @Body(parsedBy(technicalCheckSchema)) { note }: z.infer<typeof technicalCheckSchema>,
    @Intended() intention: Intention,
  ): Promise<PacketView> {
    return this.once.run(caller.actor, intention, async (tx) => {
      const packet = await this.checks.record(tx, caller, { packetId, note: note ?? null })
      return this.views.viewOf(tx, packet)
    })
  }

  /** Agreeing twice is agreeing once, so no key is asked for. */
  @Post('consent')
  @HttpCode(200)
  @Requires('packet:sign')
  consent(
    @WhoCalls() caller: Caller,
    @Param('id', idParam) packetId: string,
    @Body(parsedBy(consentSchema)) { consentVersion }: z.infer<typeof consentSchema>,
  ): Promise<PacketView> {
    return this.unitOfWork.run(caller.actor, async (tx) => {
      const packet = await this.readings.consent(tx, caller, { packetId, consentVersion })
      return this.views.viewOf(tx, packet)
    })
  }

  @Post('read-pages')
  @HttpCode(200)
  @Requires('packet:sign')
  readPage(
    @WhoCalls() caller: Caller,
    @Param('id', idParam) packetId: string,
    @Body(parsedBy(readPageSchema)) { page }: z.infer<typeof readPageSchema>,
  ): Promise<PacketView> {
    return this.unitOfWork.run(caller.actor, async (tx) => {
      const packet = await this.readings.read(tx, caller, { packetId, page })
      return this.views.viewOf(tx, packet)
    })
  }
}
