import { Injectable } from '@nestjs/common'
import type { Tx } from '../database/tx.js'

export interface QueueOptions {
  /** How often it is tried in all before it is given up. */
  maxAttempts?: number
  /** A waiting task with the same key is replaced instead of standing there twice. */
  jobKey?: string
}

/** Every task says for which district it works. */
export interface QueuePayload {
  districtId: string
}

/** Puts work in the queue. It is done after the transaction is committed, and never when it is undone. */
@Injectable()
export class Queue {
  async add(
    tx: Tx,
    task: string,
    payload: QueuePayload,
    { maxAttempts = 10, jobKey }: QueueOptions = {},
  ): Promise<void> {
    await tx.manager.query(
      'select graphile_worker.add_job($1, payload := $2::json, max_attempts := $3, job_key := $4)',
      [task, JSON.stringify(payload), maxAttempts, jobKey ?? null],
    )
  }
}
