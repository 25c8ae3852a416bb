import { Injectable } from '@nestjs/common'
import type { Role } from 'shared'
import type { Tx } from '../../platform/database/tx.js'
import { NotesService } from '../../reviews/notes.service.js'
import type { ActScene } from './act-context.js'

interface NoteOfAct {
  text: string
  page?: number
  /** A reason that ends a job asks nobody for an answer. */
  isSettled?: boolean
}

/** Writes down what comes with an act, as a note on the packet the act is about. */
@Injectable()
export class ActNotesService {
  constructor(private readonly notes: NotesService) {}

  async write(tx: Tx, context: ActScene, { text, page, isSettled }: NoteOfAct): Promise<string> {
    const { actor, facts, job, revision } = context
    const { id } = await this.notes.write(tx, {
      jobId: job.id,
      text,
      revision,
      authorId: actor.personId,
      authorRole: roleIn(context),
      isSettled: isSettled ?? false,
      ...(facts.packetA === null ? {} : { packetId: facts.packetA.id }),
      ...(page === undefined ? {} : { page }),
    })
    return id
  }
}

/** A producer speaks as landowner on the own job, whatever else that person is in the district. */
function roleIn({ actor, facts }: ActScene): Role {
  if (facts.payeeAndKinIds.includes(actor.personId)) return 'landowner'
  return actor.roles.find((role) => role !== 'landowner') ?? 'landowner'
}
