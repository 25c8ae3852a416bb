import { Body, Controller, Get, HttpCode, Param, Post, Put } from '@nestjs/common'
import {
  readScheduleLinesCsv,
  mapScheduleLinesSchema,
  scheduleInputSchema,
  type ScheduleCsv,
  type ScheduleInput,
  type ScheduleLine,
  type ScheduleListItem,
  type ScheduleView,
} from 'shared'
import type { Caller } from '../platform/auth/caller.js'
import { Requires } from '../platform/auth/requires.decorator.js'
import { Upload, UploadedBytes } from '../platform/auth/upload.decorator.js'
import { WhoCalls } from '../platform/auth/who-calls.decorator.js'
import { UnitOfWork } from '../platform/database/unit-of-work.js'
import { Intended, type Intention } from '../platform/idempotency/intended.decorator.js'
import { OnceService } from '../platform/idempotency/once.service.js'
import { idParam } from '../platform/web/id-param.js'
import { parsedBy } from '../platform/web/parsed-by.js'
import { readTextFile } from '../platform/web/read-text-file.js'
import { SeenVersion } from '../platform/web/seen-version.decorator.js'
import { ScheduleViewsService } from './schedule-views.service.js'
import { SchedulesService } from './schedules.service.js'

@Controller('schedules')
export class SchedulesController {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly once: OnceService,
    private readonly schedules: SchedulesService,
    private readonly views: ScheduleViewsService,
  ) {}

  @Get()
  @Requires('schedule:read')
  list(@WhoCalls() { actor }: Caller): Promise<ScheduleListItem[]> {
    return this.unitOfWork.run(actor, (tx) => this.views.list(tx))
  }

  @Post()
  @Requires('schedule:write')
  create(
    @WhoCalls() { actor }: Caller,
    @Body(parsedBy(scheduleInputSchema)) input: ScheduleInput,
  ): Promise<ScheduleView> {
    return this.unitOfWork.run(actor, (tx) => this.schedules.create(tx, input))
  }

  /** Reads and keeps nothing: the lines go back to the form, with what is wrong beside each. */
  @Post('read-csv')
  @HttpCode(200)
  @Upload()
  @Requires('schedule:write')
  readCsv(@UploadedBytes() bytes: Buffer): ScheduleCsv {
    return readTextFile(bytes, (text) => readScheduleLinesCsv({ text }))
  }

  @Get(':id')
  @Requires('schedule:read')
  read(@WhoCalls() { actor }: Caller, @Param('id', idParam) id: string): Promise<ScheduleView> {
    return this.unitOfWork.run(actor, (tx) => this.views.read(tx, id))
  }

  @Put(':id')
  @Requires('schedule:write')
  update(
    @WhoCalls() { actor }: Caller,
    @Param('id', idParam) id: string,
    @SeenVersion() version: number,
    @Body(parsedBy(scheduleInputSchema)) input: ScheduleInput,
  ): Promise<ScheduleView> {
    return this.unitOfWork.run(actor, (tx) => this.schedules.update(tx, { id, version }, input))
  }

  @Put(':id/mapping')
  @Requires('schedule:write')
  map(
    @WhoCalls() { actor }: Caller,
    @Param('id', idParam) id: string,
    @SeenVersion() version: number,
    @Body(parsedBy(mapScheduleLinesSchema))
    { mapping }: { mapping: Pick<ScheduleLine, 'code' | 'quantityKey'>[] },
  ): Promise<ScheduleView> {
    return this.unitOfWork.run(actor, (tx) => this.schedules.map(tx, { id, version }, mapping))
  }

  @Post(':id/put-in-force')
  @HttpCode(200)
  @Requires('schedule:write')
  putInForce(
    @WhoCalls() { actor }: Caller,
    @Intended() intention: Intention,
    @Param('id', idParam) id: string,
  ): Promise<ScheduleView> {
    return this.once.run(actor, intention, (tx) => this.schedules.putInForce(tx, id))
  }
}
