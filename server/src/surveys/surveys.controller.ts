import { Body, Controller, Get, HttpCode, Param, Post, Put } from '@nestjs/common'
import {
  readLevelNotesCsv,
  surveyInputSchema,
  type LevelNotesCsv,
  type SurveyInput,
  type SurveyView,
} from 'shared'
import type { Caller } from '../platform/auth/caller.js'
import { Requires } from '../platform/auth/requires.decorator.js'
import { Upload, UploadedBytes } from '../platform/auth/upload.decorator.js'
import { WhoCalls } from '../platform/auth/who-calls.decorator.js'
import { UnitOfWork } from '../platform/database/unit-of-work.js'
import { idParam } from '../platform/web/id-param.js'
import { parsedBy } from '../platform/web/parsed-by.js'
import { readTextFile } from '../platform/web/read-text-file.js'
import { SeenVersion } from '../platform/web/seen-version.decorator.js'
import { SurveysService } from './surveys.service.js'

@Controller()
export class SurveysController {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly surveys: SurveysService,
  ) {}

  @Get('jobs/:id/survey')
  @Requires('design:read')
  read(@WhoCalls() caller: Caller, @Param('id', idParam) jobId: string): Promise<SurveyView> {
    return this.unitOfWork.run(caller.actor, (tx) => this.surveys.read(tx, caller, jobId))
  }

  @Put('jobs/:id/survey')
  @Requires('survey:write')
  save(
    @WhoCalls() caller: Caller,
    @Param('id', idParam) jobId: string,
    @SeenVersion() version: number,
    @Body(parsedBy(surveyInputSchema)) survey: SurveyInput,
  ): Promise<SurveyView> {
    return this.unitOfWork.run(caller.actor, (tx) =>
      this.surveys.save(tx, caller, { jobId, version, survey }),
    )
  }

  /** Reads a file for the form and stores nothing. */
  @Post('surveys/read-csv')
  @HttpCode(200)
  @Requires('survey:write')
  @Upload()
  readCsv(@UploadedBytes() bytes: Buffer): LevelNotesCsv {
    return readTextFile(bytes, (text) => readLevelNotesCsv({ text }))
  }
}
