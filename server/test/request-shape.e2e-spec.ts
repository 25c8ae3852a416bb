import request from 'supertest'
import { problemCatalogue, type ProblemSlug } from 'shared'
import { expectProblem } from './support/expect-problem'
import { makeReadyDistrict, type ReadyDistrict } from './support/ready-district'
import { startTestApp, type TestApp } from './support/test-app'

let app: TestApp
let district: ReadyDistrict

beforeAll(async () => {
  app = await startTestApp()
  district = await makeReadyDistrict(app, 'Sable Basin District (example)')
})
afterAll(() => app.stop())

const producer = { name: 'Hale Orne', farmName: 'Orne Farm' }

/** As any program may send it, with the cookie of a planner and no header of our own page. */
const bare = (method: 'get' | 'post' | 'put', path: string) =>
  request(app.nest.getHttpServer())[method](`/api${path}`).set('Cookie', district.planner.api.cookie)

const ownPage = (path: string) =>
  bare('post', path).set('Origin', app.config.publicOrigin).set('X-Wadestone', '1')

const producers = async (): Promise<number> => (await district.planner.api.get('/producers')).body.length

describe('a request that changes something', () => {
  const foreign: [name: string, headers: Record<string, string>][] = [
    ['without an origin', { 'X-Wadestone': '1' }],
    ['from another site', { Origin: 'https://elsewhere.example', 'X-Wadestone': '1' }],
    ['from the same host under another port', { Origin: 'http://127.0.0.1:8461', 'X-Wadestone': '1' }],
    ['from a page without an origin of its own', { Origin: 'null', 'X-Wadestone': '1' }],
    ['without the header of our page', { Origin: 'http://127.0.0.1:8460' }],
  ]

  it.each(foreign)('%s is refused, signed in or not, and changes nothing', async (_name, headers) => {
    const before = await producers()
    expectProblem(await bare('post', '/producers').set(headers).send(producer), 'foreign-origin')
    expectProblem(await bare('put', '/settings').set(headers).send({}), 'foreign-origin')
    const signIn = { email: district.planner.email, password: 'x' }
    expectProblem(
      await bare('post', '/session').set('Cookie', '').set(headers).send(signIn),
      'foreign-origin',
    )
    expect(await producers()).toBe(before)
  })

  it('from our own page is taken', async () => {
    await ownPage('/producers').send(producer).expect(201)
  })

  it.each([
    'text/plain',
    'application/x-www-form-urlencoded',
    'multipart/form-data; boundary=x',
    'image/png',
  ])('as %s is refused where JSON is taken', async (type) => {
    const before = await producers()
    const answer = await ownPage('/producers').set('Content-Type', type).send(JSON.stringify(producer))
    expectProblem(answer, 'wrong-media-type')
    expect(await producers()).toBe(before)
  })

  it('as JSON is refused where a file is taken', async () => {
    expectProblem(await ownPage('/surveys/read-csv').send({ file: 'label' }), 'wrong-media-type')
  })

  it('over one megabyte is refused', async () => {
    const name = 'x'.repeat(1024 * 1024)
    expectProblem(await ownPage('/producers').send({ ...producer, name }), 'body-too-large')
  })

  it('with a file over two megabytes is refused', async () => {
    const answer = await district.planner.api.upload(
      '/surveys/read-csv',
      'a.csv',
      Buffer.alloc(2_200_000, 'a'),
    )
    expectProblem(answer, 'body-too-large')
  })

  it('with two files, or a file under another name, is refused', async () => {
    const two = ownPage('/surveys/read-csv').attach('file', Buffer.from('a'), 'a.csv')
    expectProblem(await two.attach('file', Buffer.from('b'), 'b.csv'), 'malformed-request')
    const misnamed = ownPage('/surveys/read-csv').attach('notes', Buffer.from('a'), 'a.csv')
    expectProblem(await misnamed, 'malformed-request')
  })

  it('whose JSON is broken is refused', async () => {
    const broken = ['{"name": ', '{name: 1}', 'nothing', '[1,', '"\\ud800']
    for (const text of broken) {
      const answer = await ownPage('/producers').set('Content-Type', 'application/json').send(text)
      expectProblem(answer, 'malformed-request')
    }
  })

  it('whose JSON is something else than an object is refused beside the fields', async () => {
    for (const body of ['[]', '{}']) {
      const answer = await ownPage('/producers').set('Content-Type', 'application/json').send(body)
      expectProblem(answer, 'invalid-fields')
    }
  })

  it('that plants fields of the language itself changes nothing but the fields it may', async () => {
    const planted = '{"name":"Hale","farmName":"Orne","__proto__":{"isMighty":true},"constructor":{}}'
    const answer = await ownPage('/producers').set('Content-Type', 'application/json').send(planted)
    expectProblem(answer, 'invalid-fields')
    expect('isMighty' in {}).toBe(false)
  })
})

describe('a request that reads', () => {
  it('needs neither origin nor header', async () => {
    await bare('get', '/jobs').expect(200)
    await bare('get', '/health').set('Cookie', '').expect(200)
  })

  it('is for no cache, and carries the headers that keep a browser careful', async () => {
    const { headers } = await bare('get', '/jobs').expect(200)
    expect(headers).toMatchObject({
      'cache-control': 'no-store',
      'x-content-type-options': 'nosniff',
      'content-security-policy': expect.stringContaining("default-src 'self'"),
    })
    expect(headers['x-powered-by']).toBeUndefined()
    expect(headers['access-control-allow-origin']).toBeUndefined()
  })

  it('of what is not there, or by signs no text holds, is a problem like any other', async () => {
    const answers: [string, ProblemSlug][] = [
      ['/nothing', 'not-found'],
      ['/jobs/x/y/z', 'not-found'],
      ['/producers?find=%00', 'invalid-fields'],
      ['/jobs?limit=many', 'invalid-fields'],
      ['/jobs?unknown=1', 'invalid-fields'],
      ['/jobs?cursor=forged', 'malformed-request'],
    ]
    for (const [path, slug] of answers) {
      const answer = await bare('get', path)
      expect([path, answer.status]).toEqual([path, problemCatalogue[slug].status])
      expectProblem(answer, slug)
    }
  })
})
