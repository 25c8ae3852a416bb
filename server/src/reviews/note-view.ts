import type { NoteView } from 'shared'
import type { NoteAnswer } from './note-answer.entity.js'
import type { Note } from './note.entity.js'

interface NoteParts {
  note: Note
  answers: readonly NoteAnswer[]
  nameOf: (personId: string) => string
}

export function noteView({ note, answers, nameOf }: NoteParts): NoteView {
  return {
    id: note.id,
    jobId: note.jobId,
    ...(note.packetId === null ? {} : { packetId: note.packetId }),
    ...(note.page === null ? {} : { page: note.page }),
    ...(note.xMm === null ? {} : { xMm: note.xMm }),
    ...(note.yMm === null ? {} : { yMm: note.yMm }),
    text: note.text,
    revision: note.revision,
    author: nameOf(note.authorId),
    authorId: note.authorId,
    at: note.writtenAt.toISOString(),
    status: note.status,
    answers: answers.map(({ authorId, writtenAt, text }) => ({
      author: nameOf(authorId),
      at: writtenAt.toISOString(),
      text,
    })),
  }
}
