import { Entity, Index, Unique } from 'typeorm'
import type { PacketStatus, PacketView } from 'shared'
import {
  CountColumn,
  DistrictIdColumn,
  IdColumn,
  InstantColumn,
  JsonColumn,
  ReferenceColumn,
  TextColumn,
} from '../platform/database/columns.js'
import { RefersTo } from '../platform/database/references.js'
import type { PacketDocument } from './document/packet-document.js'

/** A is read and signed; B adds signatures and evidence after approval. Neither is made again once ready. */
@Entity('packets')
@Unique(['districtId', 'revisionId', 'kind'])
@Index(['districtId', 'jobId'])
@RefersTo('jobs', 'jobId')
@RefersTo('revisions', 'revisionId')
@RefersTo('files', 'fileId')
export class Packet {
  @DistrictIdColumn() districtId: string

  @IdColumn() id: string

  @ReferenceColumn() jobId: string

  @ReferenceColumn() revisionId: string

  @TextColumn() kind: PacketView['kind']

  @TextColumn() status: PacketStatus

  /** The whole document, ready to draw; tens of kilobytes, so it is read only where it is drawn. */
  @JsonColumn({ nullable: true, select: false }) view: PacketDocument | null

  @CountColumn({ nullable: true }) viewVersion: number | null

  @JsonColumn({ nullable: true }) pages: PacketView['pages'] | null

  @ReferenceColumn({ nullable: true }) fileId: string | null

  @TextColumn({ nullable: true }) sha256: string | null

  @CountColumn({ nullable: true }) sizeBytes: number | null

  @TextColumn({ nullable: true }) failure: string | null

  @ReferenceColumn() requestedBy: string

  @InstantColumn() requestedAt: Date

  @InstantColumn({ nullable: true }) readyAt: Date | null
}
