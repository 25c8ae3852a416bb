import { ForeignKey } from 'typeorm'

/** The referenced table is named, so that no domain has to import another for its keys. */
type Target = string

/** A foreign key to a row of the same district: the district is part of the key, so no row can point outside. */
export const RefersTo = (target: Target, column: string): ClassDecorator =>
  ForeignKey(target, ['districtId', column] as const, ['districtId', 'id'])

/** The same where the other table is keyed by that very column, such as a membership by its person. */
export const RefersToKey = (target: Target, column: string): ClassDecorator =>
  ForeignKey(target, ['districtId', column] as const, ['districtId', column])

/** A foreign key to a table that belongs to no district. */
export const RefersToGlobal = (target: Target, column: string): ClassDecorator =>
  ForeignKey(target, [column] as const, ['id'])

/** A row that is part of another and goes with it. */
export const RefersToOwner = (target: Target, column: string): ClassDecorator =>
  ForeignKey(target, ['districtId', column] as const, ['districtId', 'id'], { onDelete: 'CASCADE' })
