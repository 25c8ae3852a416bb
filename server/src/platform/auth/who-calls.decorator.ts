import { createParamDecorator, type ExecutionContext } from '@nestjs/common'
import type { Request } from 'express'
import type { Caller } from './caller.js'

export const WhoCalls = createParamDecorator(
  (_: unknown, context: ExecutionContext): Caller =>
    context.switchToHttp().getRequest<Request & { user: Caller }>().user,
)
