import { Injectable } from '@nestjs/common'
import { randomUUID } from 'node:crypto'
import type { Tx } from '../platform/database/tx.js'
import { Approval } from './approval.entity.js'

export interface ApprovalToRecord {
  jobId: string
  packetId: string
  packetSha256: string
  supervisorId: string
  meetingDate: string | null
  agendaItem: string | null
}

@Injectable()
export class ApprovalsService {
  async record(tx: Tx, given: ApprovalToRecord): Promise<Approval> {
    const approval = tx.manager.create(Approval, {
      ...given,
      districtId: tx.districtId,
      id: randomUUID(),
      approvedAt: tx.at,
    })
    await tx.manager.insert(Approval, approval)
    return approval
  }

  ofPacket(tx: Tx, packetId: string): Promise<Approval | null> {
    return tx.manager.findOneBy(Approval, { districtId: tx.districtId, packetId })
  }
}
