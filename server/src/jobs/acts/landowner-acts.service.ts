import { Injectable } from '@nestjs/common'
import { isOwnName, Problem } from 'shared'
import { Person } from '../../accounts/person.entity.js'
import type { Tx } from '../../platform/database/tx.js'
import { SignaturesService } from '../../signatures/signatures.service.js'
import type { ActContext, ActEffect } from './act-context.js'
import { ActNotesService } from './act-notes.service.js'
import { packetAOf } from './packet-of-act.js'

/** What a signer's acts leave behind. */
@Injectable()
export class LandownerActs {
  constructor(
    private readonly signatures: SignaturesService,
    private readonly notes: ActNotesService,
  ) {}

  async sign(tx: Tx, context: ActContext<'sign'>): Promise<ActEffect> {
    const { packetId, sha256 } = packetAOf(context)
    await this.refuseOtherName(tx, context)
    const { cameByLink, ...origin } = context.origin
    const { id } = await this.signatures.record(tx, {
      jobId: context.job.id,
      packetId,
      packetSha256: sha256,
      personId: context.actor.personId,
      typedName: context.act.typedName,
      method: cameByLink ? 'mailed-link-and-code' : 'password',
      ...origin,
    })
    return { facts: { signatureId: id, packetSha256: sha256 } }
  }

  private async refuseOtherName(tx: Tx, { act, actor }: ActContext<'sign'>): Promise<void> {
    const { name } = await tx.manager.findOneByOrFail(Person, { id: actor.personId })
    if (isOwnName(act.typedName, name)) return
    const message = `Type your name as it stands on the packet: ${name}.`
    throw new Problem('invalid-fields', { detail: message, fields: [{ pointer: '/typedName', message }] })
  }

  async askForChanges(tx: Tx, context: ActContext<'ask-for-changes'>): Promise<ActEffect> {
    const { note, page } = context.act
    const noteId = await this.notes.write(tx, context, {
      text: note,
      ...(page === undefined ? {} : { page }),
    })
    return { facts: { noteIds: [noteId] } }
  }

  async takeSignatureBack(tx: Tx, context: ActContext<'take-signature-back'>): Promise<ActEffect> {
    const { reason } = context.act
    const { job, actor } = context
    const signatureIds = await this.signatures.voidStanding(tx, {
      jobId: job.id,
      personId: actor.personId,
      reason: `Taken back: ${reason}`,
    })
    const noteId = await this.notes.write(tx, context, { text: reason })
    return { facts: { signatureIds, noteIds: [noteId] } }
  }

  async withdraw(tx: Tx, context: ActContext<'withdraw'>): Promise<ActEffect> {
    const noteId = await this.notes.write(tx, context, { text: context.act.reason, isSettled: true })
    return { facts: { noteIds: [noteId] } }
  }
}
