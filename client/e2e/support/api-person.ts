import { randomUUID } from 'node:crypto'
import { address } from './address'
import type { SignIn } from './sign-ins'

interface CallOptions {
  body?: unknown
  version?: number
  isAct?: boolean
}

/** One person's way through the HTTP API: for what a test needs to find there before it opens a page. */
export class ApiPerson {
  static readonly #known = new Map<string, ApiPerson>()
  #cookie = ''

  /** Signs in once; whoever asks again goes on with that session. */
  static async signedIn({ email, password }: SignIn): Promise<ApiPerson> {
    const known = ApiPerson.#known.get(email)
    if (known !== undefined) return known
    const person = new ApiPerson()
    await person.post('/session', { email, password })
    ApiPerson.#known.set(email, person)
    return person
  }

  get = <T>(path: string) => this.#call<T>('GET', path, {})
  post = <T>(path: string, body: unknown = {}) => this.#call<T>('POST', path, { body })
  /** Carries a key, so that a repeat would be harmless. */
  act = <T>(path: string, body: unknown = {}) => this.#call<T>('POST', path, { body, isAct: true })
  put = <T>(path: string, body: unknown, version: number) => this.#call<T>('PUT', path, { body, version })

  async #call<T>(method: string, path: string, { body, version, isAct }: CallOptions): Promise<T> {
    const response = await fetch(`${address}/api${path}`, {
      method,
      headers: {
        origin: address,
        'x-wadestone': '1',
        cookie: this.#cookie,
        ...(body === undefined ? {} : { 'content-type': 'application/json' }),
        ...(version === undefined ? {} : { 'if-match': `"v${version}"` }),
        ...(isAct ? { 'idempotency-key': randomUUID() } : {}),
      },
      body: body === undefined ? null : JSON.stringify(body),
    })
    const text = await response.text()
    if (!response.ok) throw new Error(`${method} ${path} was answered ${response.status}: ${text}`)
    const [session] = response.headers.getSetCookie()
    if (session !== undefined) this.#cookie = session.split(';')[0] ?? ''
    return (text === '' ? null : JSON.parse(text)) as T
  }
}
