import { randomUUID } from 'node:crypto'

/** An answer the tour did not expect. */
export class Refused extends Error {
  constructor(call, status, problem) {
    const said = [problem?.title, problem?.detail, ...(problem?.reasons ?? [])]
    const fields = (problem?.fields ?? []).map(({ pointer, message }) => `${pointer}: ${message}`)
    super(`${call} was answered ${status}: ${[...said, ...fields].filter(Boolean).join(' · ')}`)
    this.status = status
    this.problem = problem
  }
}

/** One person's way through the HTTP API: a cookie jar of one cookie, and the headers a browser would send. */
export class ApiSession {
  #cookie = ''

  constructor(address) {
    this.address = address
  }

  async call(method, path, { body, form, ifMatch, key } = {}) {
    const headers = { origin: this.address, 'x-wadestone': '1', cookie: this.#cookie }
    if (body !== undefined) headers['content-type'] = 'application/json'
    if (ifMatch !== undefined) headers['if-match'] = `"v${ifMatch}"`
    if (key !== undefined) headers['idempotency-key'] = key
    const response = await fetch(`${this.address}/api${path}`, {
      method,
      headers,
      body: form ?? (body === undefined ? undefined : JSON.stringify(body)),
    })
    const set = response.headers.getSetCookie().find((cookie) => cookie.startsWith('__Host-wadestone='))
    if (set) this.#cookie = set.split(';')[0]
    return response
  }

  async #json(method, path, options) {
    const response = await this.call(method, path, options)
    const text = await response.text()
    const document = text === '' ? null : JSON.parse(text)
    if (!response.ok) throw new Refused(`${method} /api${path}`, response.status, document)
    return document
  }

  get(path) {
    return this.#json('GET', path)
  }

  post(path, body = {}) {
    return this.#json('POST', path, { body })
  }

  /** An act: the key makes a repeat of it harmless. */
  act(path, body = {}, key = randomUUID()) {
    return this.#json('POST', path, { body, key })
  }

  put(path, body, version) {
    return this.#json('PUT', path, { body, ifMatch: version })
  }

  upload(path, name, text) {
    const form = new FormData()
    form.append('file', new Blob([text], { type: 'text/csv' }), name)
    return this.#json('POST', path, { form })
  }

  async bytes(path) {
    const response = await this.call('GET', path)
    if (!response.ok) throw new Refused(`GET /api${path}`, response.status, await response.json())
    return Buffer.from(await response.arrayBuffer())
  }

  async signIn({ email, password }) {
    return this.post('/session', { email, password })
  }
}
