import 'reflect-metadata'
import { ConsoleLogger } from '@nestjs/common'
import { NestFactory } from '@nestjs/core'
import type { NestExpressApplication } from '@nestjs/platform-express'
import { DataSource } from 'typeorm'
import { AppModule } from './app.module.js'
import { readConfig } from './platform/config/read-config.js'
import { requirePlainRole, requireSchema } from './platform/database/require-schema.js'
import { configureWeb } from './platform/web/configure-web.js'

const config = readConfig(process.env)
const app = await NestFactory.create<NestExpressApplication>(AppModule.forRoot(config), {
  bodyParser: false,
  // A browser keeps its connections open; without this a stop would wait for them.
  forceCloseConnections: true,
  logger: new ConsoleLogger({ logLevels: ['warn', 'error', 'fatal'], colors: false }),
})
const dataSource = app.get(DataSource)
await requirePlainRole(dataSource)
await requireSchema(dataSource)
configureWeb(app, config)
await app.listen(config.port, config.host)
