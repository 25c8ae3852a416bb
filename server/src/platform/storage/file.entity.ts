import { Entity } from 'typeorm'
import {
  BytesColumn,
  CountColumn,
  DistrictIdColumn,
  IdColumn,
  InstantColumn,
  ReferenceColumn,
  TextColumn,
} from '../database/columns.js'

/** Bytes that are written once. They are never read along with a row. */
@Entity('files')
export class StoredFile {
  @DistrictIdColumn() districtId: string

  @IdColumn() id: string

  @TextColumn() sha256: string

  @TextColumn() contentType: string

  @CountColumn() sizeBytes: number

  @BytesColumn() bytes: Buffer

  @ReferenceColumn({ nullable: true }) createdBy: string | null

  @InstantColumn() createdAt: Date
}
