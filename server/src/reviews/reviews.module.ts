import { Module } from '@nestjs/common'
import { JobsModule } from '../jobs/jobs.module.js'
import { PacketsModule } from '../packets/packets.module.js'
import { ApprovalsService } from './approvals.service.js'
import { JobNotesService } from './job-notes.service.js'
import { NoteViewsService } from './note-views.service.js'
import { NotesController } from './notes.controller.js'
import { NotesService } from './notes.service.js'

@Module({
  imports: [JobsModule, PacketsModule],
  controllers: [NotesController],
  providers: [ApprovalsService, JobNotesService, NoteViewsService, NotesService],
  exports: [ApprovalsService, NotesService],
})
export class ReviewsModule {}
