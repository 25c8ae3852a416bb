import { Column, PrimaryColumn, type ColumnOptions } from 'typeorm'

/** The first half of the primary key of every table that belongs to a district. */
export const DistrictIdColumn = (): PropertyDecorator => PrimaryColumn('uuid')

export const IdColumn = (): PropertyDecorator => PrimaryColumn('uuid')

export const ReferenceColumn = (options: ColumnOptions = {}): PropertyDecorator =>
  Column({ type: 'uuid', ...options })

export const TextColumn = (options: ColumnOptions = {}): PropertyDecorator =>
  Column({ type: 'text', ...options })

/** Milliseconds, as a Date holds them, so that what is read back equals what was written. */
export const InstantColumn = (options: ColumnOptions = {}): PropertyDecorator =>
  Column({ type: 'timestamp with time zone', precision: 3, ...options })

/** A civil date stays text from the database to the wire. */
export const CivilDateColumn = (options: ColumnOptions = {}): PropertyDecorator =>
  Column({ type: 'date', ...options })

/** Money comes back as a decimal string of two places. */
export const MoneyColumn = (options: ColumnOptions = {}): PropertyDecorator =>
  Column({ type: 'numeric', precision: 14, scale: 2, ...options })

export const RateColumn = (options: ColumnOptions = {}): PropertyDecorator =>
  Column({ type: 'numeric', precision: 14, scale: 4, ...options })

export const NumberColumn = (options: ColumnOptions = {}): PropertyDecorator =>
  Column({ type: 'double precision', ...options })

export const CountColumn = (options: ColumnOptions = {}): PropertyDecorator =>
  Column({ type: 'integer', ...options })

export const FlagColumn = (options: ColumnOptions = {}): PropertyDecorator =>
  Column({ type: 'boolean', ...options })

export const JsonColumn = (options: ColumnOptions = {}): PropertyDecorator =>
  Column({ type: 'jsonb', ...options })

/** Counts the edits of a document; it is what ETag and If-Match carry. */
export const VersionColumn = (): PropertyDecorator => Column('integer', { default: 1 })

export const IdTextColumn = (): PropertyDecorator => PrimaryColumn('text')

export const PositionColumn = (): PropertyDecorator => PrimaryColumn('integer')

/** File bytes are left out of every query that does not ask for them by name. */
export const BytesColumn = (): PropertyDecorator => Column('bytea', { select: false })
