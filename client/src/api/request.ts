import { noConnection, parseProblem } from './problem-error'
import { sessionExpired } from './session-expired'

export interface RequestOptions {
  method?: 'GET' | 'POST' | 'PUT' | 'DELETE'
  body?: unknown
  file?: File
  /** Version of the document that was seen; sent as If-Match. */
  version?: number
  idempotencyKey?: string
  signal?: AbortSignal
}

function headersFor(options: RequestOptions): Headers {
  const headers = new Headers({ Accept: 'application/json', 'X-Wadestone': '1' })
  if (options.body !== undefined) headers.set('Content-Type', 'application/json')
  if (options.version !== undefined) headers.set('If-Match', `"v${options.version}"`)
  if (options.idempotencyKey !== undefined) headers.set('Idempotency-Key', options.idempotencyKey)
  return headers
}

function bodyFor(options: RequestOptions): BodyInit | null {
  if (options.file !== undefined) {
    const form = new FormData()
    form.set('file', options.file)
    return form
  }
  return options.body === undefined ? null : JSON.stringify(options.body)
}

const readJson = async (response: Response): Promise<unknown> => {
  const text = await response.text()
  if (text === '') return undefined
  try {
    return JSON.parse(text)
  } catch {
    return text
  }
}

interface Answer {
  body: unknown
  headers: Headers
}

async function answerOf(path: string, options: RequestOptions): Promise<Answer> {
  let response: Response
  let body: unknown
  try {
    response = await fetch(`/api${path}`, {
      method: options.method ?? 'GET',
      headers: headersFor(options),
      body: bodyFor(options),
      credentials: 'same-origin',
      signal: options.signal ?? null,
    })
    body = await readJson(response)
  } catch (cause) {
    if (options.signal?.aborted) throw cause
    throw noConnection()
  }
  if (response.ok) return { body, headers: response.headers }
  const problem = parseProblem(response.status, body)
  if (problem.slug === 'not-signed-in') sessionExpired.raise()
  throw problem
}

/** The one way to the server. Resolves with the body, rejects with a ProblemError. */
export async function request<T>(path: string, options: RequestOptions = {}): Promise<T> {
  const { body } = await answerOf(path, options)
  return body as T
}

export interface Versioned<T> {
  version: number
  view: T
}

/** For a document whose version is told beside it, in the ETag. */
export async function requestVersioned<T>(path: string, options: RequestOptions = {}): Promise<Versioned<T>> {
  const { body, headers } = await answerOf(path, options)
  return { version: Number(/"v(\d+)"/.exec(headers.get('ETag') ?? '')?.[1]), view: body as T }
}
