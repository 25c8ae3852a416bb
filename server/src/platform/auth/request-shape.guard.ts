import { Injectable, type CanActivate, type ExecutionContext } from '@nestjs/common'
import { Reflector } from '@nestjs/core'
import type { Request } from 'express'
import { Problem } from 'shared'
import { Config } from '../config/config.js'
import { uploadKey } from './upload.decorator.js'

const reading = ['GET', 'HEAD', 'OPTIONS']

/**
 * A request that changes something must come from our own page: the right origin, a header that no form of another
 * site can set, and a kind of content that no form can send.
 */
@Injectable()
export class RequestShapeGuard implements CanActivate {
  constructor(
    private readonly reflector: Reflector,
    private readonly config: Config,
  ) {}

  canActivate(context: ExecutionContext): boolean {
    const request = context.switchToHttp().getRequest<Request>()
    if (reading.includes(request.method)) return true
    if (request.get('origin') !== this.config.publicOrigin || request.get('x-wadestone') !== '1') {
      throw new Problem('foreign-origin')
    }
    const isUpload = this.reflector.get<boolean>(uploadKey, context.getHandler()) === true
    if (!hasContent(request)) return true
    const wanted = isUpload ? 'multipart/form-data' : 'application/json'
    // A type that takes no part in what Express parses would leave the body unread, as if nothing had been sent.
    if (typeof request.is(wanted) !== 'string') {
      throw new Problem('wrong-media-type', { detail: `Send this as ${wanted}.` })
    }
    if (isDeeperThan(request.body, deepest)) {
      throw new Problem('malformed-request', { detail: 'The body is nested too deeply.' })
    }
    return true
  }
}

/** No document of ours comes near; what is deeper would only exhaust the stack of whoever walks it. */
const deepest = 40

const isDeeperThan = (value: unknown, levels: number): boolean =>
  typeof value === 'object' &&
  value !== null &&
  (levels === 0 || Object.values(value).some((part) => isDeeperThan(part, levels - 1)))

const hasContent = (request: Request): boolean =>
  request.get('transfer-encoding') !== undefined || Number(request.get('content-length') ?? 0) > 0
