import { Body, Controller, Get, HttpCode, Param, Post } from '@nestjs/common'
import { noteAnswerSchema, noteInputSchema, type NoteInput, type NoteView } from 'shared'
import type { z } from 'zod'
import type { Caller } from '../platform/auth/caller.js'
import { Requires } from '../platform/auth/requires.decorator.js'
import { WhoCalls } from '../platform/auth/who-calls.decorator.js'
import { UnitOfWork } from '../platform/database/unit-of-work.js'
import { idParam } from '../platform/web/id-param.js'
import { parsedBy } from '../platform/web/parsed-by.js'
import { JobNotesService } from './job-notes.service.js'

@Controller()
export class NotesController {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly notes: JobNotesService,
  ) {}

  @Get('jobs/:id/notes')
  @Requires('note:read')
  list(@WhoCalls() caller: Caller, @Param('id', idParam) jobId: string): Promise<NoteView[]> {
    return this.unitOfWork.run(caller.actor, (tx) => this.notes.list(tx, caller, jobId))
  }

  @Post('jobs/:id/notes')
  @Requires('note:write')
  write(
    @WhoCalls() caller: Caller,
    @Param('id', idParam) jobId: string,
    @Body(parsedBy(noteInputSchema)) input: NoteInput,
  ): Promise<NoteView> {
    return this.unitOfWork.run(caller.actor, (tx) => this.notes.write(tx, caller, { jobId, input }))
  }

  @Post('notes/:id/answer')
  @HttpCode(200)
  @Requires('note:answer')
  answer(
    @WhoCalls() caller: Caller,
    @Param('id', idParam) noteId: string,
    @Body(parsedBy(noteAnswerSchema)) { text }: z.infer<typeof noteAnswerSchema>,
  ): Promise<NoteView> {
    return this.unitOfWork.run(caller.actor, (tx) => this.notes.answer(tx, caller, noteId, text))
  }

  @Post('notes/:id/settle')
  @HttpCode(200)
  @Requires('note:write')
  settle(@WhoCalls() caller: Caller, @Param('id', idParam) noteId: string): Promise<NoteView> {
    return this.unitOfWork.run(caller.actor, (tx) => this.notes.settle(tx, caller, noteId))
  }
}
