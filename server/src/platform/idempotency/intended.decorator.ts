import { createHash } from 'node:crypto'
import { createParamDecorator, type ExecutionContext } from '@nestjs/common'
import type { Request } from 'express'
import { Problem } from 'shared'
import { canonicalJson } from '../events/canonical-json.js'

/** One thing a person means to do once, however often the request arrives. */
export interface Intention {
  key: string
  /** Of what was asked: the same key for anything else is a mistake. */
  fingerprint: string
}

const keyPattern = /^[\w-]{8,100}$/

export const Intended = createParamDecorator((_: unknown, context: ExecutionContext): Intention => {
  const request = context.switchToHttp().getRequest<Request>()
  const key = request.get('idempotency-key') ?? ''
  if (!keyPattern.test(key)) {
    const message = 'This act needs an Idempotency-Key of 8 to 100 letters, digits and hyphens.'
    throw new Problem('invalid-fields', {
      detail: message,
      fields: [{ pointer: '/headers/idempotency-key', message }],
    })
  }
  const asked = [request.method, request.originalUrl, canonicalJson(request.body ?? null)].join('\n')
  return { key, fingerprint: createHash('sha256').update(asked).digest('hex') }
})
