import { Global, Module, type DynamicModule } from '@nestjs/common'
import { APP_FILTER, APP_INTERCEPTOR } from '@nestjs/core'
import { TypeOrmModule } from '@nestjs/typeorm'
import type { EntityTarget, ObjectLiteral } from 'typeorm'
import { AuthModule } from './auth/auth.module.js'
import { Clock, SystemClock } from './clock/clock.js'
import { Config } from './config/config.js'
import { dataSourceOptions } from './database/data-source-options.js'
import { UnitOfWork } from './database/unit-of-work.js'
import { EventLog } from './events/event-log.service.js'
import { HealthController } from './health/health.controller.js'
import { OnceService } from './idempotency/once.service.js'
import { ProblemFilter } from './problems/problem.filter.js'
import { QueueRunner } from './queue/queue-runner.service.js'
import { QueueTasks } from './queue/queue-tasks.js'
import { Queue } from './queue/queue.service.js'
import { FileStore } from './storage/file-store.service.js'
import { EtagInterceptor } from './web/etag.interceptor.js'

const shared = [UnitOfWork, EventLog, FileStore, OnceService, Queue, QueueTasks, QueueRunner]

/** What every domain stands on. */
@Global()
@Module({})
export class PlatformModule {
  static forRoot(config: Config, entities: EntityTarget<ObjectLiteral>[]): DynamicModule {
    return {
      module: PlatformModule,
      imports: [
        TypeOrmModule.forRoot({
          ...dataSourceOptions({ url: config.databaseUrl, entities }),
          retryAttempts: 2,
          retryDelay: 500,
        }),
        AuthModule,
      ],
      controllers: [HealthController],
      providers: [
        { provide: Config, useValue: config },
        { provide: Clock, useClass: SystemClock },
        { provide: APP_FILTER, useClass: ProblemFilter },
        { provide: APP_INTERCEPTOR, useClass: EtagInterceptor },
        ...shared,
      ],
      exports: [Config, Clock, ...shared],
    }
  }
}
