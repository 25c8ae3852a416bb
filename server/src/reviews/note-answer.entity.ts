import { Entity, Index } from 'typeorm'
import {
  DistrictIdColumn,
  IdColumn,
  InstantColumn,
  ReferenceColumn,
  TextColumn,
} from '../platform/database/columns.js'
import { RefersTo } from '../platform/database/references.js'

@Entity('note_answers')
@Index(['districtId', 'noteId', 'writtenAt'])
@RefersTo('notes', 'noteId')
export class NoteAnswer {
  @DistrictIdColumn() districtId: string

  @IdColumn() id: string

  @ReferenceColumn() noteId: string

  @ReferenceColumn() authorId: string

  @TextColumn() text: string

  @InstantColumn() writtenAt: Date
}
