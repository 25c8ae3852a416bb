import { createHmac, timingSafeEqual } from 'node:crypto'
import { Injectable } from '@nestjs/common'
import { instantSchema, idSchema, Problem } from 'shared'
import { z } from 'zod'
import { Config } from '../platform/config/config.js'
import type { ListPosition } from './job-list-query.js'

const positionSchema = z.strictObject({ updatedAt: instantSchema, id: idSchema })

/** Where a page of the list ended. It is signed, so that nobody walks the list from a place of their own making. */
@Injectable()
export class ListCursor {
  constructor(private readonly config: Config) {}

  write(position: ListPosition): string {
    const body = Buffer.from(JSON.stringify(position)).toString('base64url')
    return `${body}.${this.signature(body).toString('base64url')}`
  }

  /** @throws Problem malformed-request when it is not one that this server wrote. */
  read(cursor: string): ListPosition {
    const [body = '', signature = ''] = cursor.split('.')
    const given = Buffer.from(signature, 'base64url')
    const expected = this.signature(body)
    if (given.length !== expected.length || !timingSafeEqual(given, expected)) {
      throw new Problem('malformed-request', {
        detail: 'The place in the list is not one that Wadestone gave. Begin at the first page.',
      })
    }
    return positionSchema.parse(JSON.parse(Buffer.from(body, 'base64url').toString('utf8')))
  }

  private signature(body: string): Buffer {
    return createHmac('sha256', this.config.secrets.cursorSecret).update(`job-list:${body}`).digest()
  }
}
