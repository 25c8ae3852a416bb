import { Injectable } from '@nestjs/common'
import { DataSource, type EntityManager } from 'typeorm'
import { Clock } from '../clock/clock.js'
import type { AccountsTx, Tx } from './tx.js'

export interface Scope {
  personId: string | null
  districtId: string
}

/** The only place that opens a transaction. Row security reads what it sets here. */
@Injectable()
export class UnitOfWork {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
  ) {}

  /** Runs `work` in one transaction that sees one district. What it throws undoes all of it. */
  run<T>({ personId, districtId }: Scope, work: (tx: Tx) => Promise<T>): Promise<T> {
    return this.dataSource.transaction(async (manager) => {
      await setLocal(manager, { person: personId ?? '', district: districtId })
      return work({ manager, districtId, personId, at: this.clock.now() })
    })
  }

  /** For sign-in, which has to look before it knows the district. */
  runForAccounts<T>(work: (tx: AccountsTx) => Promise<T>): Promise<T> {
    return this.dataSource.transaction(async (manager) => {
      await setLocal(manager, { accounts: 'on' })
      return work({ manager, at: this.clock.now() })
    })
  }
}

/** Opens the accounts for one step of a district's transaction, such as adding a person, and shuts them again. */
export async function withAccounts<T>(tx: Tx, work: (accounts: AccountsTx) => Promise<T>): Promise<T> {
  await setLocal(tx.manager, { accounts: 'on' })
  const result = await work(tx)
  await setLocal(tx.manager, { accounts: 'off' })
  return result
}

/** The settings end with the transaction, so a pooled connection carries nothing over. */
async function setLocal(manager: EntityManager, settings: Record<string, string>): Promise<void> {
  const entries = Object.entries(settings)
  const calls = entries.map((_, index) => `set_config($${index * 2 + 1}, $${index * 2 + 2}, true)`)
  const values = entries.flatMap(([key, value]) => [`wadestone.${key}`, value])
  await manager.query(`select ${calls.join(', ')}`, values)
}
