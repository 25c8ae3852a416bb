import { randomUUID } from 'node:crypto'
import request, { type Test } from 'supertest'

type Server = Parameters<typeof request>[0]

interface Extras {
  version?: number
  key?: string
}

/** One browser: a cookie, and the headers our own page sends. */
export class ApiClient {
  cookie = ''

  constructor(
    private readonly server: Server,
    private readonly origin: string,
  ) {}

  get(path: string): Test {
    return this.keepCookie(request(this.server).get(`/api${path}`).set('Cookie', this.cookie))
  }

  post(path: string, body: object = {}, extras: Extras = {}): Test {
    return this.send(request(this.server).post(`/api${path}`), extras).send(body)
  }

  put(path: string, body: object, extras: Extras = {}): Test {
    return this.send(request(this.server).put(`/api${path}`), extras).send(body)
  }

  delete(path: string): Test {
    return this.send(request(this.server).delete(`/api${path}`), {})
  }

  /** An act, once: with a key of its own unless one is given. */
  act(path: string, body: object = {}, key: string = randomUUID()): Test {
    return this.post(path, body, { key })
  }

  upload(path: string, name: string, content: Buffer | string): Test {
    return this.send(request(this.server).post(`/api${path}`), {}).attach('file', Buffer.from(content), name)
  }

  async signIn({ email, password }: { email: string; password: string }): Promise<this> {
    await this.post('/session', { email, password }).expect(201)
    return this
  }

  private send(test: Test, { version, key }: Extras): Test {
    const given = test.set('Cookie', this.cookie).set('Origin', this.origin).set('X-Wadestone', '1')
    if (version !== undefined) given.set('If-Match', `"v${version}"`)
    if (key !== undefined) given.set('Idempotency-Key', key)
    return this.keepCookie(given)
  }

  private keepCookie(test: Test): Test {
    return test.expect((response) => {
      const set: string[] = [response.headers['set-cookie'] ?? []].flat()
      const own = set.find((cookie) => cookie.startsWith('__Host-wadestone='))
      if (own !== undefined) this.cookie = own.split(';')[0] ?? ''
    })
  }
}
