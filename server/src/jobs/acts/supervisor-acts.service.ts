import { Injectable } from '@nestjs/common'
import { PacketsService } from '../../packets/packets.service.js'
import type { Tx } from '../../platform/database/tx.js'
import { ApprovalsService } from '../../reviews/approvals.service.js'
import type { ActContext, ActEffect } from './act-context.js'
import { ActNotesService } from './act-notes.service.js'
import { packetAOf } from './packet-of-act.js'

/** What a supervisor's acts leave behind. */
@Injectable()
export class SupervisorActs {
  constructor(
    private readonly approvals: ApprovalsService,
    private readonly packets: PacketsService,
    private readonly notes: ActNotesService,
  ) {}

  /** The approval, and the packet with signatures and evidence that follows from it. */
  async approve(tx: Tx, context: ActContext<'approve'>): Promise<ActEffect> {
    const { packetId, sha256 } = packetAOf(context)
    const { meetingDate = null, agendaItem = null } = context.act
    const approval = await this.approvals.record(tx, {
      jobId: context.job.id,
      packetId,
      packetSha256: sha256,
      supervisorId: context.actor.personId,
      meetingDate,
      agendaItem,
    })
    const finalPacket = await this.packets.makeFinal(tx, packetId)
    return {
      finalPacketId: finalPacket.id,
      facts: { approvalId: approval.id, packetSha256: sha256, finalPacketId: finalPacket.id },
    }
  }

  async returnWithNotes(tx: Tx, context: ActContext<'return'>): Promise<ActEffect> {
    const noteIds: string[] = []
    for (const text of context.act.notes) noteIds.push(await this.notes.write(tx, context, { text }))
    return { facts: { notes: noteIds.length, noteIds } }
  }
}
