import { randomUUID } from 'node:crypto'
import { DataSource } from 'typeorm'
import { entities } from '../../src/entities'
import { dataSourceOptions } from '../../src/platform/database/data-source-options'
import { migrate } from '../../src/platform/database/migrate'

const appPassword = 'only-for-one-test-run'

export interface TestDatabase {
  /** As the role the server uses. */
  appUrl: string
  /** As the owner of the tables. Of a cluster of our own that is also its superuser, whom row security does not bind. */
  owner: DataSource
  drop(): Promise<void>
}

function ownerUrl(): URL {
  const url = process.env.TEST_DATABASE_OWNER_URL
  if (url === undefined)
    throw new Error('TEST_DATABASE_OWNER_URL is not set. Run these tests by: npm test server')
  return new URL(url)
}

function named(database: string): URL {
  const url = ownerUrl()
  url.pathname = `/${database}`
  return url
}

/** A migrated database of its own, so that test files can run side by side. */
export async function makeTestDatabase(): Promise<TestDatabase> {
  const name = `test_${randomUUID().replaceAll('-', '')}`
  const admin = await new DataSource({ type: 'postgres', url: ownerUrl().href }).initialize()
  await admin.query(`create database ${name}`)
  const url = named(name)
  const owner = await new DataSource(dataSourceOptions({ url: url.href, entities, poolSize: 3 })).initialize()
  await migrate({ dataSource: owner, url: url.href, appPassword })
  const appUrl = new URL(url)
  appUrl.username = 'wadestone_app'
  appUrl.password = appPassword
  return {
    appUrl: appUrl.href,
    owner,
    async drop() {
      await owner.destroy()
      await admin.query(`drop database ${name} with (force)`)
      await admin.destroy()
    },
  }
}
