import {
  Injectable,
  Logger,
  type BeforeApplicationShutdown,
  type OnApplicationBootstrap,
} from '@nestjs/common'
import { Logger as QueueLogger, run, runOnce, type Runner } from 'graphile-worker'
import pg from 'pg'
import { Config } from '../config/config.js'
import { QueueTasks } from './queue-tasks.js'
import { unlockDead, queueConnectionName } from './unlock-dead.js'

const sweepEveryMs = 60_000

/** Works the queue off beside the requests. Any number of servers may do so at once. */
@Injectable()
export class QueueRunner implements OnApplicationBootstrap, BeforeApplicationShutdown {
  private readonly log = new Logger('Queue')
  private readonly pool: pg.Pool
  private runner: Runner | null = null
  private sweep: NodeJS.Timeout | null = null

  constructor(
    private readonly config: Config,
    private readonly tasks: QueueTasks,
  ) {
    this.pool = new pg.Pool({
      connectionString: config.databaseUrl,
      application_name: queueConnectionName,
      max: 4,
    })
    const warn = () => this.log.warn('The queue lost its connection to the database')
    this.pool.on('error', warn)
    // A connection that is out of the pool tells only those who listen to itself.
    this.pool.on('connect', (client) => client.on('error', warn))
  }

  async onApplicationBootstrap(): Promise<void> {
    if (!this.config.worksQueue) return
    await unlockDead(this.pool)
    this.runner = await run({ ...this.options(), concurrency: 2, pollInterval: 1_000, noHandleSignals: true })
    this.sweep = setInterval(() => void unlockDead(this.pool).catch(() => undefined), sweepEveryMs)
    this.sweep.unref()
  }

  /** Does all that waits now and returns. For tests and scripts, where no runner stands by. */
  async drain(): Promise<void> {
    await runOnce(this.options())
  }

  async beforeApplicationShutdown(): Promise<void> {
    if (this.sweep !== null) clearInterval(this.sweep)
    await this.runner?.stop()
    await this.pool.end()
  }

  private options() {
    return { pgPool: this.pool, taskList: this.tasks.list(), logger: quietLogger(this.log) }
  }
}

/** The queue's own messages name the task and its payload; only that something failed is worth a line. */
function quietLogger(log: Logger): QueueLogger {
  return new QueueLogger(() => (level, message) => {
    if (level === 'error') log.error(message.split('\n')[0])
  })
}
