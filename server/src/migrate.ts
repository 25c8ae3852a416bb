import 'reflect-metadata'
import { DataSource } from 'typeorm'
import { z } from 'zod'
import { entities } from './entities.js'
import { dataSourceOptions } from './platform/database/data-source-options.js'
import { migrate } from './platform/database/migrate.js'

const environment = z
  .object({ DATABASE_OWNER_URL: z.url(), APP_DATABASE_PASSWORD: z.string().min(8).optional() })
  .parse(process.env)

const url = environment.DATABASE_OWNER_URL
const dataSource = await new DataSource(dataSourceOptions({ url, entities, poolSize: 2 })).initialize()
try {
  await migrate({ dataSource, url, appPassword: environment.APP_DATABASE_PASSWORD })
} finally {
  await dataSource.destroy()
}
