import { Injectable } from '@nestjs/common'
import { Problem, reachOf, type NoteInput, type NoteView, type Role } from 'shared'
import { JobAccessService, type Asking } from '../jobs/job-access.service.js'
import { PacketsService } from '../packets/packets.service.js'
import type { Tx } from '../platform/database/tx.js'
import { NoteViewsService } from './note-views.service.js'
import type { Note } from './note.entity.js'
import { NotesService } from './notes.service.js'

/** Notes as the people of a job use them. A landowner sees the own ones and what was answered to them. */
@Injectable()
export class JobNotesService {
  constructor(
    private readonly jobs: JobAccessService,
    private readonly packets: PacketsService,
    private readonly notes: NotesService,
    private readonly views: NoteViewsService,
  ) {}

  async list(tx: Tx, asking: Asking, jobId: string): Promise<NoteView[]> {
    await this.jobs.find(tx, asking, 'note:read', jobId, 'to-read')
    const all = await this.notes.ofJob(tx, jobId)
    const seesAll = reachOf(asking.actor, 'note:read') === 'district'
    return this.views.of(tx, seesAll ? all : all.filter(({ authorId }) => authorId === asking.actor.personId))
  }

  async write(
    tx: Tx,
    asking: Asking,
    { jobId, input }: { jobId: string; input: NoteInput },
  ): Promise<NoteView> {
    const job = await this.jobs.find(tx, asking, 'note:write', jobId, 'to-change')
    const { actor } = asking
    const packetId = input.packetId ?? null
    const revision =
      packetId === null ? null : await this.revisionShown(tx, asking, { jobId: job.id, packetId })
    const authorRole = writingRole(reachOf(actor, 'note:write'), actor.roles)
    const note = await this.notes.write(tx, {
      ...input,
      jobId,
      revision,
      authorId: actor.personId,
      authorRole,
    })
    return this.view(tx, note)
  }

  async answer(tx: Tx, asking: Asking, noteId: string, text: string): Promise<NoteView> {
    const note = await this.notes.find(tx, noteId, 'to-change')
    await this.jobs.find(tx, asking, 'note:answer', note.jobId, 'to-read')
    await this.notes.answer(tx, note, { authorId: asking.actor.personId, text })
    return this.view(tx, await this.notes.find(tx, noteId, 'to-read'))
  }

  async settle(tx: Tx, asking: Asking, noteId: string): Promise<NoteView> {
    const note = await this.notes.find(tx, noteId, 'to-change')
    await this.jobs.find(tx, asking, 'note:write', note.jobId, 'to-read')
    await this.notes.settle(tx, note, asking.actor)
    return this.view(tx, await this.notes.find(tx, noteId, 'to-read'))
  }

  /** A note may only point at a packet of its own job that its author may read. */
  private async revisionShown(
    tx: Tx,
    asking: Asking,
    { jobId, packetId }: { jobId: string; packetId: string },
  ): Promise<number> {
    const shown = await this.packets.revisionShownTo(tx, asking, packetId)
    if (shown?.jobId === jobId) return shown.revision
    const message = 'This packet is not one of the job.'
    throw new Problem('invalid-fields', { fields: [{ pointer: '/packetId', message }] })
  }

  private async view(tx: Tx, note: Note): Promise<NoteView> {
    const [view] = await this.views.of(tx, [note])
    if (view === undefined) throw new Error(`Note ${note.id} has no view.`)
    return view
  }
}

/** Who reaches only own jobs writes as landowner. */
function writingRole(reach: 'own' | 'district' | null, roles: readonly Role[]): Role {
  if (reach !== 'district') return 'landowner'
  return roles.find((role) => role === 'planner' || role === 'supervisor') ?? 'planner'
}
