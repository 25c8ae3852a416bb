import { randomUUID } from 'node:crypto'
import { Catch, Logger, type ArgumentsHost, type ExceptionFilter } from '@nestjs/common'
import type { Request, Response } from 'express'
import { problemDocument } from 'shared'
import { toProblem } from './to-problem.js'

/** The only place that answers with an error (RFC 9457). */
@Catch()
export class ProblemFilter implements ExceptionFilter {
  private readonly log = new Logger('Problem')

  catch(thrown: unknown, host: ArgumentsHost): void {
    const http = host.switchToHttp()
    const response = http.getResponse<Response>()
    const problem = toProblem(thrown)
    const requestId = randomUUID()
    const document = problemDocument(problem, requestId)
    if (document.status >= 500) this.note(requestId, http.getRequest<Request>(), thrown)
    if (response.headersSent) {
      response.destroy()
      return
    }
    const { retryAfterSeconds } = problem.extras
    if (retryAfterSeconds !== undefined) response.set('Retry-After', String(retryAfterSeconds))
    response.status(document.status).type('application/problem+json').send(JSON.stringify(document))
  }

  /** The path without its query: what people look for is their business. */
  private note(requestId: string, { method, path }: Request, thrown: unknown): void {
    const what = thrown instanceof Error ? (thrown.stack ?? thrown.message) : String(thrown)
    this.log.error(`${requestId} ${method} ${path} ${what}`)
  }
}
