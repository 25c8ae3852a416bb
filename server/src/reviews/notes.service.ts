import { Injectable } from '@nestjs/common'
import { randomUUID } from 'node:crypto'
import { Problem, type NoteInput, type Role } from 'shared'
import type { Tx } from '../platform/database/tx.js'
import { EventLog } from '../platform/events/event-log.service.js'
import { NoteAnswer } from './note-answer.entity.js'
import { refuseAnswer, refuseSettling, type Settler } from './note-rules.js'
import { Note } from './note.entity.js'

export interface NoteToWrite extends NoteInput {
  jobId: string
  revision: number | null
  authorId: string
  authorRole: Role
  /** For words that ask nobody for an answer. */
  isSettled?: boolean
}

/** Notes stay with the job: an open one goes on from revision to revision until somebody settles it. */
@Injectable()
export class NotesService {
  constructor(private readonly events: EventLog) {}

  async write(tx: Tx, given: NoteToWrite): Promise<Note> {
    const note = tx.manager.create(Note, {
      districtId: tx.districtId,
      id: randomUUID(),
      jobId: given.jobId,
      packetId: given.packetId ?? null,
      revision: given.revision,
      page: given.page ?? null,
      xMm: given.xMm ?? null,
      yMm: given.yMm ?? null,
      text: given.text,
      authorId: given.authorId,
      authorRole: given.authorRole,
      writtenAt: tx.at,
      ...(given.isSettled === true
        ? { status: 'settled', settledBy: given.authorId, settledAt: tx.at }
        : { status: 'open', settledBy: null, settledAt: null }),
    })
    await tx.manager.insert(Note, note)
    await this.tell(tx, note, 'note-written')
    return note
  }

  async answer(tx: Tx, note: Note, { authorId, text }: { authorId: string; text: string }): Promise<void> {
    refuseAnswer(note)
    await tx.manager.insert(NoteAnswer, {
      districtId: tx.districtId,
      id: randomUUID(),
      noteId: note.id,
      authorId,
      text,
      writtenAt: tx.at,
    })
    await tx.manager.update(Note, { districtId: tx.districtId, id: note.id }, { status: 'answered' })
    await this.tell(tx, note, 'note-answered')
  }

  async settle(tx: Tx, note: Note, settler: Settler): Promise<void> {
    refuseSettling(note, settler)
    const change = { status: 'settled' as const, settledBy: settler.personId, settledAt: tx.at }
    await tx.manager.update(Note, { districtId: tx.districtId, id: note.id }, change)
    await this.tell(tx, note, 'note-settled')
  }

  ofJob(tx: Tx, jobId: string): Promise<Note[]> {
    return tx.manager.find(Note, {
      where: { districtId: tx.districtId, jobId },
      order: { writtenAt: 'ASC', id: 'ASC' },
    })
  }

  /** @param lock `to-change` holds the note, so that it is answered or settled by one person at a time. */
  async find(tx: Tx, noteId: string, lock: 'to-read' | 'to-change'): Promise<Note> {
    const note = await tx.manager.findOne(Note, {
      where: { districtId: tx.districtId, id: noteId },
      ...(lock === 'to-change' ? { lock: { mode: 'pessimistic_write' } } : {}),
    })
    if (note === null) throw new Problem('not-found')
    return note
  }

  private async tell(tx: Tx, note: Note, kind: string): Promise<void> {
    const facts = { noteId: note.id, revision: note.revision, page: note.page }
    await this.events.append(tx, { streamId: note.jobId, kind, facts })
  }
}
