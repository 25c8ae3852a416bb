import { Body, Controller, Get, Put } from '@nestjs/common'
import { settingsInputSchema, type SettingsView, type SettingValue } from 'shared'
import type { Caller } from '../platform/auth/caller.js'
import { Requires } from '../platform/auth/requires.decorator.js'
import { WhoCalls } from '../platform/auth/who-calls.decorator.js'
import { UnitOfWork } from '../platform/database/unit-of-work.js'
import { parsedBy } from '../platform/web/parsed-by.js'
import { SeenVersion } from '../platform/web/seen-version.decorator.js'
import { SettingsService } from './settings.service.js'

@Controller('settings')
export class SettingsController {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly settings: SettingsService,
  ) {}

  @Get()
  @Requires('settings:read')
  read(@WhoCalls() { actor }: Caller): Promise<SettingsView> {
    return this.unitOfWork.run(actor, (tx) => this.settings.read(tx))
  }

  @Put()
  @Requires('settings:write')
  save(
    @WhoCalls() { actor }: Caller,
    @SeenVersion() version: number,
    @Body(parsedBy(settingsInputSchema)) { settings }: { settings: SettingValue[] },
  ): Promise<SettingsView> {
    return this.unitOfWork.run(actor, (tx) => this.settings.save(tx, version, settings))
  }
}
