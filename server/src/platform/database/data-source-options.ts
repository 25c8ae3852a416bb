import pg from 'pg'
import type { DataSourceOptions, EntityTarget, MixedList, ObjectLiteral } from 'typeorm'
import { migrations } from './migrations/migrations.js'
import { NamingStrategy } from './naming-strategy.js'

// A civil date stays the text the database gives: a Date object would move it with the zone of the machine.
const dateOid = 1082
pg.types.setTypeParser(dateOid, (text) => text)

export interface DataSourceInput {
  url: string
  entities: EntityTarget<ObjectLiteral>[]
  poolSize?: number
}

export function dataSourceOptions({ url, entities, poolSize = 10 }: DataSourceInput): DataSourceOptions {
  return {
    type: 'postgres',
    url,
    entities: entities as MixedList<never>,
    migrations: [...migrations],
    migrationsTransactionMode: 'all',
    namingStrategy: new NamingStrategy(),
    synchronize: false,
    // Not even the type metadata check may write: the server's role owns nothing.
    installExtensions: false,
    poolSize,
    applicationName: 'wadestone',
    logging: false,
    invalidWhereValuesBehavior: { null: 'throw', undefined: 'throw' },
    extra: { connectionTimeoutMillis: 5_000, statement_timeout: 30_000, options: '-c timezone=UTC' },
  }
}
