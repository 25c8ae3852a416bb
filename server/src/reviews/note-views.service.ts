import { Injectable } from '@nestjs/common'
import type { NoteView } from 'shared'
import { In } from 'typeorm'
import { Person } from '../accounts/person.entity.js'
import type { Tx } from '../platform/database/tx.js'
import { NoteAnswer } from './note-answer.entity.js'
import { noteView } from './note-view.js'
import type { Note } from './note.entity.js'

/** Notes with their answers and the names of those who wrote them. */
@Injectable()
export class NoteViewsService {
  async of(tx: Tx, notes: readonly Note[]): Promise<NoteView[]> {
    if (notes.length === 0) return []
    const answers = await tx.manager.find(NoteAnswer, {
      where: { districtId: tx.districtId, noteId: In(notes.map(({ id }) => id)) },
      order: { writtenAt: 'ASC', id: 'ASC' },
    })
    const names = await this.names(tx, [...notes, ...answers])
    const nameOf = (personId: string): string => names.get(personId) ?? 'A person who left'
    return notes.map((note) => {
      return noteView({ note, nameOf, answers: answers.filter(({ noteId }) => noteId === note.id) })
    })
  }

  private async names(tx: Tx, written: readonly { authorId: string }[]): Promise<Map<string, string>> {
    const ids = [...new Set(written.map(({ authorId }) => authorId))]
    const people = await tx.manager.findBy(Person, { id: In(ids) })
    return new Map(people.map(({ id, name }) => [id, name]))
  }
}
