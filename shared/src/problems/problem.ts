import { problemCatalogue, type ProblemSlug } from './catalogue.js'

export interface FieldProblem {
  /** JSON pointer into the body, such as /ramp/gradeRunPerRise. */
  readonly pointer: string
  readonly message: string
}

export interface ProblemExtras {
  /** One or more whole sentences for the person. */
  readonly detail?: string
  readonly fields?: readonly FieldProblem[]
  /** What still blocks an act. */
  readonly reasons?: readonly string[]
  /** The newer document, when the version was stale. */
  readonly current?: unknown
  readonly retryAfterSeconds?: number
}

/** Thrown by code, turned into application/problem+json by one filter. */
export class Problem extends Error {
  constructor(
    readonly slug: ProblemSlug,
    readonly extras: ProblemExtras = {},
  ) {
    super(extras.detail ?? problemCatalogue[slug].title)
    this.name = 'Problem'
  }
}

export interface ProblemDocument extends ProblemExtras {
  readonly type: string
  readonly title: string
  readonly status: number
  readonly requestId?: string
}

export function problemDocument(problem: Problem, requestId?: string): ProblemDocument {
  const { status, title } = problemCatalogue[problem.slug]
  return { type: `urn:wadestone:problem:${problem.slug}`, title, status, ...problem.extras, requestId }
}

/** The slug of a problem document, for the client's parser; null for anything else. */
export function problemSlug(document: unknown): ProblemSlug | null {
  if (typeof document !== 'object' || document === null || !('type' in document)) return null
  const slug = String(document.type).replace('urn:wadestone:problem:', '')
  return slug in problemCatalogue ? (slug as ProblemSlug) : null
}
