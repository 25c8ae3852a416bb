import { Body, Controller, Get, HttpCode, Param, Post, Res } from '@nestjs/common'
import type { Response } from 'express'
import { makePacketSchema, type PacketView } from 'shared'
import type { z } from 'zod'
import type { Caller } from '../platform/auth/caller.js'
import { Requires } from '../platform/auth/requires.decorator.js'
import { WhoCalls } from '../platform/auth/who-calls.decorator.js'
import { UnitOfWork } from '../platform/database/unit-of-work.js'
import { Intended, type Intention } from '../platform/idempotency/intended.decorator.js'
import { OnceService } from '../platform/idempotency/once.service.js'
import { idParam } from '../platform/web/id-param.js'
import { parsedBy } from '../platform/web/parsed-by.js'
import { MakePacketService } from './make-packet.service.js'
import { PacketAccessService } from './packet-access.service.js'
import { PacketFileService } from './packet-file.service.js'
import { PacketViewService } from './packet-view.service.js'

@Controller()
export class PacketsController {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly once: OnceService,
    private readonly maker: MakePacketService,
    private readonly access: PacketAccessService,
    private readonly files: PacketFileService,
    private readonly views: PacketViewService,
  ) {}

  @Post('jobs/:id/packets')
  @HttpCode(202)
  @Requires('packet:make')
  make(
    @WhoCalls() caller: Caller,
    @Param('id', idParam) jobId: string,
    @Body(parsedBy(makePacketSchema)) { designId }: z.infer<typeof makePacketSchema>,
    @Intended() intention: Intention,
  ): Promise<PacketView> {
    return this.once.run(caller.actor, intention, async (tx) => {
      const packet = await this.maker.makeForReading(tx, caller, { jobId, designId })
      return this.views.viewOf(tx, packet)
    })
  }

  @Post('packets/:id/make-again')
  @HttpCode(202)
  @Requires('packet:make-again')
  makeAgain(
    @WhoCalls() caller: Caller,
    @Param('id', idParam) packetId: string,
    @Intended() intention: Intention,
  ): Promise<PacketView> {
    return this.once.run(caller.actor, intention, async (tx) => {
      const packet = await this.maker.makeAgain(tx, caller, packetId)
      return this.views.viewOf(tx, packet)
    })
  }

  @Get('packets/:id')
  @Requires('packet:read')
  read(@WhoCalls() caller: Caller, @Param('id', idParam) packetId: string): Promise<PacketView> {
    return this.unitOfWork.run(caller.actor, async (tx) => {
      const wanted = { permission: 'packet:read', packetId, lock: 'to-read' } as const
      const { packet } = await this.access.find(tx, caller, wanted)
      return this.views.viewOf(tx, packet)
    })
  }

  @Get('packets/:id/file')
  @Requires('packet:read')
  async readFile(
    @WhoCalls() caller: Caller,
    @Param('id', idParam) packetId: string,
    @Res() response: Response,
  ): Promise<void> {
    const file = await this.unitOfWork.run(caller.actor, (tx) => this.files.read(tx, caller, packetId))
    response
      .type(file.contentType)
      .set('Content-Disposition', `inline; filename="${file.fileName}"`)
      .set('ETag', `"${file.sha256}"`)
      .send(file.bytes)
  }
}
