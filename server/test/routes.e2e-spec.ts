import { randomUUID } from 'node:crypto'
import { problemCatalogue, reachOf, roles, type Permission, type Role } from 'shared'
import type { Response } from 'supertest'
import { CostListsService } from '../src/districts/cost-lists.service'
import { CriteriaSetsService } from '../src/districts/criteria-sets.service'
import { SchedulesService } from '../src/schedules/schedules.service'
import { declaredRoutes, servedRoutes, type Route } from './support/all-routes'
import type { ApiClient } from './support/api-client'
import { expectProblem } from './support/expect-problem'
import { openSession } from './support/open-session'
import { makeReadyDistrict, type ReadyDistrict } from './support/ready-district'
import { routeAccess } from './support/route-access'
import { draftCosts, draftCriteria, draftSchedule, routeSamples, type Ids } from './support/route-samples'
import { rowsOf } from './support/rows-of-district'
import { drawStandIns } from './support/stand-in-renderer'
import { startTestApp, type TestApp } from './support/test-app'
import { Walk, type Walked } from './support/walk'

interface SentJob {
  walked: Walked
  ids: Ids
  landowner: { api: ApiClient; personId: string }
}

let app: TestApp
let own: ReadyDistrict
let other: ReadyDistrict
let job: SentJob
/** In the same district, of another producer. */
let neighbour: SentJob
let foreign: SentJob
let routes: Route[]

beforeAll(async () => {
  app = await startTestApp()
  drawStandIns(app)
  own = await makeReadyDistrict(app, 'Sable Basin District (example)')
  other = await makeReadyDistrict(app, 'Tarn Hollow District (example)')
  job = await sentJob(own, 'one@farms.example')
  neighbour = await sentJob(own, 'two@farms.example')
  foreign = await sentJob(other, 'three@farms.example')
  routes = declaredRoutes(app)
})
afterAll(() => app.stop())

/** A job with its landowner, and one thing of each kind that an id may name. */
async function sentJob(district: ReadyDistrict, email: string): Promise<SentJob> {
  const walk = new Walk(app, district)
  const walked = await walk.draft(email)
  const { packet, landowner } = await walk.withLandowner(walked)
  const note = await landowner.post(`/jobs/${walked.job.id}/notes`, { text: 'Is this mine?' }).expect(201)
  const drafts = await app.inDistrict(district.districtId, async (tx) => ({
    schedule: (await app.nest.get(SchedulesService, { strict: false }).create(tx, draftSchedule!)).id,
    criteriaSet: (await app.nest.get(CriteriaSetsService, { strict: false }).create(tx, draftCriteria)).id,
    costList: (await app.nest.get(CostListsService, { strict: false }).create(tx, draftCosts)).id,
  }))
  const [message] = (await district.office.api.get(`/jobs/${walked.job.id}/mail`).expect(200)).body
  const { body } = await landowner.get('/session')
  const ids: Ids = {
    ...drafts,
    job: walked.job.id,
    design: walked.designId,
    producer: walked.producer.id,
    packet: packet.id,
    note: note.body.id,
    mail: message.id,
    session: body.sessionId,
  }
  return { walked, ids, landowner: { api: landowner, personId: body.personId } }
}

const callerOf = (role: Role): { api: ApiClient; personId: string } =>
  role === 'landowner' ? job.landowner : own[role]

/** What ends a session is tried on one that nobody else uses. */
async function callerOfRoute(role: Role, { method }: Route): Promise<{ api: ApiClient; ids: Ids }> {
  if (method !== 'delete') return { ...callerOf(role), ids: job.ids }
  const { api, sessionId } = await openSession(app, { ...callerOf(role), districtId: own.districtId })
  return { api, ids: { ...job.ids, session: sessionId } }
}

const pathFor = ({ name, path }: Route, ids: Ids): string =>
  path.replace(':mailId', ids.mail).replace(':id', ids[routeSamples[name]?.id ?? 'job'])

const mayCall = ({ access }: Route, role: Role): boolean =>
  access === 'public' ||
  access === 'signed-in' ||
  reachOf({ personId: '', districtId: '', roles: [role] }, access as Permission) !== null

/** Without a body, key or version: enough to see who is let in, too little to change anything by accident. */
function callBare(api: ApiClient, { method, isUpload }: Route, path: string) {
  if (isUpload) return api.upload(path, 'notes.csv', 'label')
  return method === 'get' || method === 'delete' ? api[method](path) : api[method](path, {})
}

/** With all that the route asks for, so that nothing but the id can stand against it. */
function callFully(api: ApiClient, route: Route, path: string) {
  if (route.isUpload) return callBare(api, route, path)
  const { body = {}, version, hasKey } = routeSamples[route.name] ?? {}
  if (route.method === 'get' || route.method === 'delete') return api[route.method](path)
  return api[route.method](path, body, {
    ...(version === undefined ? {} : { version }),
    ...(hasKey ? { key: randomUUID() } : {}),
  })
}

/** Refused for the role alone. A rule of the thing itself, such as of a note's author, says its reasons. */
const isForbidden = ({ status, text }: Response): boolean =>
  status === 403 && !('reasons' in JSON.parse(text))

describe('every route', () => {
  it('says who may call it, and says what is written down for it here', () => {
    expect(routes.filter(({ access }) => access === null).map(({ name }) => name)).toEqual([])
    expect(Object.fromEntries(routes.map(({ name, access }) => [name, access]))).toEqual(routeAccess)
  })

  it('that is served is declared by a controller, and the other way round', () => {
    expect(servedRoutes(app)).toEqual(routes.map(({ name }) => name))
  })

  it('that names a thing has a sample here', () => {
    const named = routes.filter(({ path }) => path.includes(':')).map(({ name }) => name)
    expect(Object.keys(routeSamples).sort()).toEqual(named.sort())
  })
})

describe('nobody', () => {
  it('is asked to sign in by every route that is not open, whatever it names', async () => {
    for (const route of routes.filter(({ access }) => access !== 'public')) {
      for (const { ids } of [job, foreign]) {
        expectProblem(await callFully(app.client(), route, pathFor(route, ids)), 'not-signed-in')
      }
    }
  })
})

describe.each(roles)('the role %s', (role) => {
  it('is let in by the routes its permissions name, and by no other', async () => {
    const wrong: string[] = []
    for (const route of routes) {
      const { api, ids } = await callerOfRoute(role, route)
      const answer = await callBare(api, route, pathFor(route, ids))
      const { status, text } = answer
      const isLetIn = !isForbidden(answer) && status !== 401 && status !== 404 && status < 500
      const isRight = mayCall(route, role) ? isLetIn : isForbidden(answer)
      const isRead = route.method !== 'get' || status === 200 || status === 403
      if (!isRight || !isRead) wrong.push(`${route.name} ${status}`)
      const leaked = Object.values(foreign.ids).filter((id) => text?.includes(id))
      if (leaked.length > 0) wrong.push(`${route.name} tells of the other district`)
    }
    expect(wrong).toEqual([])
  })

  it('finds nothing by an id of the other district, and changes nothing there', async () => {
    const before = await rowsOf(app.database.owner, other.districtId)
    for (const route of routes.filter(({ path }) => path.includes(':'))) {
      const answer = await callFully(callerOf(role).api, route, pathFor(route, foreign.ids))
      const slug = mayCall(route, role) ? 'not-found' : 'forbidden'
      expect([route.name, answer.status]).toEqual([route.name, problemCatalogue[slug].status])
      expectProblem(answer, slug)
    }
    expect(await rowsOf(app.database.owner, other.districtId)).toEqual(before)
  })
})

describe('a landowner', () => {
  it('finds nothing of a neighbour in the own district, and changes nothing there', async () => {
    const read = () => own.planner.api.get(`/jobs/${neighbour.ids.job}/events`)
    const before = (await read()).body
    for (const route of routes.filter((one) => one.path.includes(':') && mayCall(one, 'landowner'))) {
      const answer = await callFully(job.landowner.api, route, pathFor(route, neighbour.ids))
      expect([route.name, answer.status]).toEqual([route.name, 404])
    }
    expect((await read()).body).toEqual(before)
  })

  it('who signed in by password finds no job of a neighbour either', async () => {
    const { api } = await openSession(app, { ...job.landowner, districtId: own.districtId })
    await api.get(`/jobs/${job.ids.job}`).expect(200)
    expectProblem(await api.get(`/jobs/${neighbour.ids.job}`), 'not-found')
    expectProblem(await api.get(`/packets/${neighbour.ids.packet}/file`), 'not-found')
  })
})

describe('an id in a body', () => {
  it('of the other district is refused as if it did not exist, and changes nothing there', async () => {
    const before = await rowsOf(app.database.owner, other.districtId)
    const { api } = own.planner
    const draft = await new Walk(app, own).draft('four@farms.example')
    const newJob = { title: 'Taken', body: 'pond', waterName: 'Pond', county: 'Tansy' }
    const answers = [
      await api.post('/jobs', { ...newJob, producerIds: [foreign.ids.producer] }),
      await api.act(`/jobs/${draft.job.id}/packets`, { designId: foreign.ids.design }),
      await api.post(`/jobs/${draft.job.id}/notes`, { text: 'Mine?', packetId: foreign.ids.packet }),
    ]
    for (const answer of answers) expectProblem(answer, 'invalid-fields')
    expectProblem(await api.put('/session/district', { districtId: other.districtId }), 'not-found')
    expect((await api.get('/producers?find=three%40farms')).body).toEqual([])
    expect((await api.get(`/jobs?find=${foreign.walked.job.number}`)).text).not.toContain(foreign.ids.job)
    expect(await rowsOf(app.database.owner, other.districtId)).toEqual(before)
  })

  it('that is no id at all is answered as one that names nothing', async () => {
    for (const id of ['1', "x' or '1'='1", '%00', '..%2F..%2Fetc', 'a'.repeat(5000)]) {
      expectProblem(await own.planner.api.get(`/jobs/${encodeURI(id)}`), 'not-found')
    }
  })
})
