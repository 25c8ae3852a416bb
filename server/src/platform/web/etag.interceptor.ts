import { Injectable, type CallHandler, type ExecutionContext, type NestInterceptor } from '@nestjs/common'
import type { Response } from 'express'
import { map, type Observable } from 'rxjs'
import { Versioned } from './versioned.js'

/** Says which version an answer is, so that a later change can name it. */
@Injectable()
export class EtagInterceptor implements NestInterceptor {
  intercept(context: ExecutionContext, next: CallHandler): Observable<unknown> {
    const response = context.switchToHttp().getResponse<Response>()
    return next.handle().pipe(
      map((answer: unknown) => {
        const version = versionOf(answer)
        if (version !== null && !response.headersSent) response.set('ETag', `"v${version}"`)
        return answer instanceof Versioned ? answer.view : answer
      }),
    )
  }
}

function versionOf(answer: unknown): number | null {
  if (typeof answer !== 'object' || answer === null || !('version' in answer)) return null
  return typeof answer.version === 'number' ? answer.version : null
}
