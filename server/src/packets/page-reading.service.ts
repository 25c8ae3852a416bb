import { Injectable } from '@nestjs/common'
import { Problem } from 'shared'
import type { Asking } from '../jobs/job-access.service.js'
import type { Tx } from '../platform/database/tx.js'
import { EventLog } from '../platform/events/event-log.service.js'
import { ConsentsService } from '../signatures/consents.service.js'
import { PacketAccessService } from './packet-access.service.js'
import type { Packet } from './packet.entity.js'
import { PageReading } from './page-reading.entity.js'
import { revisionNumber } from './revision-number.js'

/** What a signer does with a packet before signing: opens its pages and agrees to electronic records. */
@Injectable()
export class PageReadingService {
  constructor(
    private readonly packets: PacketAccessService,
    private readonly consents: ConsentsService,
    private readonly events: EventLog,
  ) {}

  async read(
    tx: Tx,
    asking: Asking,
    { packetId, page }: { packetId: string; page: number },
  ): Promise<Packet> {
    const packet = await this.packetToSign(tx, asking, packetId)
    const count = packet.pages?.length ?? 0
    if (page > count) {
      const message = `This packet has ${count} pages.`
      throw new Problem('invalid-fields', { fields: [{ pointer: '/page', message }] })
    }
    const personId = asking.actor.personId
    const opened = await tx.manager
      .createQueryBuilder()
      .insert()
      .into(PageReading)
      .values({ districtId: tx.districtId, packetId, personId, page, readAt: tx.at })
      .orIgnore()
      .returning('page')
      .execute()
    if (Array.isArray(opened.raw) && opened.raw.length > 0) {
      await this.tell(tx, packet, 'page-read', { page })
    }
    return packet
  }

  async consent(
    tx: Tx,
    asking: Asking,
    { packetId, consentVersion }: { packetId: string; consentVersion: string },
  ): Promise<Packet> {
    const packet = await this.packetToSign(tx, asking, packetId)
    const consent = { personId: asking.actor.personId, packetId, consentVersion }
    if (await this.consents.agree(tx, consent))
      await this.tell(tx, packet, 'consent-given', { consentVersion })
    return packet
  }

  /** Holding the job makes two clicks of one person come one by one. */
  private async packetToSign(tx: Tx, asking: Asking, packetId: string): Promise<Packet> {
    const wanted = { permission: 'packet:sign', packetId, lock: 'to-change' } as const
    return (await this.packets.find(tx, asking, wanted)).packet
  }

  private async tell(
    tx: Tx,
    packet: Packet,
    kind: string,
    more: Record<string, string | number>,
  ): Promise<void> {
    const facts = { packetId: packet.id, revision: await revisionNumber(tx, packet), ...more }
    await this.events.append(tx, { streamId: packet.jobId, kind, facts })
  }
}
