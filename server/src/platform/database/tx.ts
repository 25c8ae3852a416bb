import type { EntityManager } from 'typeorm'

/**
 * One open transaction inside one district. It is handed on explicitly: whoever holds it may read and write, and
 * nobody else can.
 */
export interface Tx {
  readonly manager: EntityManager
  readonly districtId: string
  /** Who acts; null while a queue task works by itself. */
  readonly personId: string | null
  /** The instant of this unit of work. Everything it writes carries the same one. */
  readonly at: Date
}

/** A transaction that may read and write accounts before a district is known, and no table of a district. */
export interface AccountsTx {
  readonly manager: EntityManager
  readonly at: Date
}
