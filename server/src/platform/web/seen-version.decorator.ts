import { createParamDecorator, type ExecutionContext } from '@nestjs/common'
import type { Request } from 'express'
import { Problem } from 'shared'

/** The version of the document that the caller saw, from If-Match. */
export const SeenVersion = createParamDecorator((_: unknown, context: ExecutionContext): number => {
  const header = context.switchToHttp().getRequest<Request>().get('if-match')
  if (header === undefined) {
    throw new Problem('version-required', { detail: 'Send the version you saw as If-Match: "v1".' })
  }
  const version = /^"v(\d{1,9})"$/.exec(header)?.[1]
  if (version === undefined) {
    throw new Problem('malformed-request', { detail: 'If-Match is written as "v1", with the quotes.' })
  }
  return Number(version)
})
