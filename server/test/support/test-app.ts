import 'reflect-metadata'
import type { NestExpressApplication } from '@nestjs/platform-express'
import { Test } from '@nestjs/testing'
import { AppModule } from '../../src/app.module'
import { Clock } from '../../src/platform/clock/clock'
import { Config } from '../../src/platform/config/config'
import type { Tx } from '../../src/platform/database/tx'
import { UnitOfWork } from '../../src/platform/database/unit-of-work'
import { QueueRunner } from '../../src/platform/queue/queue-runner.service'
import { configureWeb } from '../../src/platform/web/configure-web'
import { ApiClient } from './api-client'
import { MailCatcher } from './mail-catcher'
import { TestClock } from './test-clock'
import { makeTestDatabase, type TestDatabase } from './test-database'

const origin = 'http://127.0.0.1:8460'

export interface TestApp {
  nest: NestExpressApplication
  database: TestDatabase
  config: Config
  clock: TestClock
  mail: MailCatcher
  /** A browser nobody has signed in with yet. */
  client(): ApiClient
  inDistrict<T>(districtId: string, work: (tx: Tx) => Promise<T>): Promise<T>
  /** Does all that waits in the queue. */
  drain(): Promise<void>
  stop(): Promise<void>
}

const secrets = {
  jwtSecret: 'a secret that only this test run knows, jwt',
  passwordPepper: 'a secret that only this test run knows, pepper',
  cursorSecret: 'a secret that only this test run knows, cursor',
}

/** The whole server on a database of its own, with a real mail server beside it. The queue runs when a test says so. */
export async function startTestApp(): Promise<TestApp> {
  const database = await makeTestDatabase()
  const mail = new MailCatcher()
  const config = new Config({
    databaseUrl: database.appUrl,
    host: '127.0.0.1',
    port: 0,
    publicOrigin: origin,
    smtpUrl: await mail.listen(),
    mailFrom: 'Wadestone <packets@wadestone.example>',
    runFolder: '/nonexistent',
    clientFolder: '/nonexistent',
    trustedProxies: [],
    isDemo: true,
    worksQueue: false,
    secrets,
  })
  const clock = new TestClock()
  const module = await Test.createTestingModule({ imports: [AppModule.forRoot(config)] })
    .overrideProvider(Clock)
    .useValue(clock)
    .compile()
  const nest = module.createNestApplication<NestExpressApplication>({ bodyParser: false, logger: false })
  configureWeb(nest, config)
  // Listening all along: supertest would open and close a port around each request, and two at once would meet.
  await nest.listen(0, '127.0.0.1')
  return {
    nest,
    database,
    config,
    clock,
    mail,
    client: () => new ApiClient(nest.getHttpServer(), origin),
    inDistrict: (districtId, work) => nest.get(UnitOfWork).run({ personId: null, districtId }, work),
    drain: () => nest.get(QueueRunner).drain(),
    async stop() {
      await nest.close()
      await mail.close()
      await database.drop()
    },
  }
}
