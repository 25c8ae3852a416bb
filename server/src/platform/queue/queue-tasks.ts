import { Injectable } from '@nestjs/common'
import type { TaskList } from 'graphile-worker'
import type { z } from 'zod'

export interface QueueAttempt {
  /** Counts from 1. */
  attempt: number
  /** When it fails now it is not tried again. */
  isLast: boolean
}

export type QueueTask<Payload> = (payload: Payload, attempt: QueueAttempt) => Promise<void>

/** Which function does which task. Each domain enters its own when its module starts. */
@Injectable()
export class QueueTasks {
  private readonly tasks: TaskList = {}

  register<Payload>(name: string, payload: z.ZodType<Payload>, task: QueueTask<Payload>): void {
    if (name in this.tasks) throw new Error(`The queue task ${name} is entered twice`)
    this.tasks[name] = (raw, { job }) =>
      task(payload.parse(raw), { attempt: job.attempts, isLast: job.attempts >= job.max_attempts })
  }

  list(): TaskList {
    return this.tasks
  }
}
