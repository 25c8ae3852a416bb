import { Injectable } from '@nestjs/common'
import { PacketsService } from '../../packets/packets.service.js'
import type { Tx } from '../../platform/database/tx.js'
import type { Job } from '../job.entity.js'
import type { ActContext, ActEffect, ActName, Recorders } from './act-context.js'
import { LandownerActs } from './landowner-acts.service.js'
import { OfficeActs } from './office-acts.service.js'
import { SupervisorActs } from './supervisor-acts.service.js'

/** Which rows an act leaves: one line per act. */
@Injectable()
export class ActRecordersService {
  private readonly recorders: Recorders

  constructor(
    landowner: LandownerActs,
    supervisor: SupervisorActs,
    office: OfficeActs,
    private readonly packets: PacketsService,
  ) {
    this.recorders = {
      'send-to-landowner': (tx, context) => office.inviteSigners(tx, context),
      sign: (tx, context) => landowner.sign(tx, context),
      'ask-for-changes': (tx, context) => landowner.askForChanges(tx, context),
      'take-signature-back': (tx, context) => landowner.takeSignatureBack(tx, context),
      approve: (tx, context) => supervisor.approve(tx, context),
      return: (tx, context) => supervisor.returnWithNotes(tx, context),
      send: (tx, context) => office.sendPacket(tx, context),
      withdraw: (tx, context) => landowner.withdraw(tx, context),
    }
  }

  record<Name extends ActName>(tx: Tx, context: ActContext<Name>): Promise<ActEffect> {
    const name: Name = context.act.action
    return this.recorders[name](tx, context)
  }

  async revisionOf(tx: Tx, { packetId }: Job): Promise<number | null> {
    return packetId === null ? null : this.packets.revisionOf(tx, packetId)
  }
}
