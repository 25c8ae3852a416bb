import type { FieldProblem, ProblemDocument, ProblemSlug } from 'shared'
import { problemSlug } from 'shared'

/** `no-connection` is our own: the server never answered, so nobody knows whether it acted. */
export type ErrorSlug = ProblemSlug | 'no-connection'

export interface ProblemErrorInit {
  slug: ErrorSlug
  status: number
  title: string
  detail?: string
  fields?: readonly FieldProblem[]
  reasons?: readonly string[]
  current?: unknown
  requestId?: string
}

/** Every failure of a request, in one shape that forms and pages can show. */
export class ProblemError extends Error {
  readonly slug: ErrorSlug
  readonly status: number
  readonly title: string
  readonly fields: readonly FieldProblem[]
  readonly reasons: readonly string[]
  readonly current: unknown
  readonly requestId: string | undefined

  constructor(init: ProblemErrorInit) {
    super(init.detail ?? init.title)
    this.name = 'ProblemError'
    this.slug = init.slug
    this.status = init.status
    this.title = init.title
    this.fields = init.fields ?? []
    this.reasons = init.reasons ?? []
    this.current = init.current
    this.requestId = init.requestId
  }
}

const isDocument = (body: unknown): body is ProblemDocument => problemSlug(body) !== null

/** Reads the body of a refused answer; anything that is no problem document becomes `unexpected`. */
export function parseProblem(status: number, body: unknown): ProblemError {
  const slug = problemSlug(body)
  if (slug === null || !isDocument(body)) {
    return new ProblemError({
      slug: status === 413 ? 'body-too-large' : status === 503 ? 'not-ready' : 'unexpected',
      status,
      title: 'Something went wrong here',
      detail: `The server answered ${status} without saying why. Nothing you typed is lost; try again.`,
    })
  }
  return new ProblemError({ ...body, slug, status })
}

export const noConnection = (): ProblemError =>
  new ProblemError({
    slug: 'no-connection',
    status: 0,
    title: 'No answer from the server',
    detail: 'The line is down or the server does not answer. What you typed is still here; try again.',
  })

/** True when the server surely did not act, so that the next press is a new intention. */
export const isCertainRefusal = (error: unknown): boolean =>
  error instanceof ProblemError && error.status >= 400 && error.status < 500 && error.slug !== 'still-running'
