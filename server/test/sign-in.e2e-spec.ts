import { randomUUID } from 'node:crypto'
import type { Response } from 'supertest'
import { Membership } from '../src/accounts/membership.entity'
import { UnitOfWork, withAccounts } from '../src/platform/database/unit-of-work'
import { addMember, giveRoles } from './support/add-member'
import type { ApiClient } from './support/api-client'
import { expectProblem, pointersOf } from './support/expect-problem'
import { forgeCookie, openSession } from './support/open-session'
import { makeReadyDistrict, testPassword, type ReadyDistrict } from './support/ready-district'
import { startTestApp, type TestApp } from './support/test-app'

let app: TestApp
let district: ReadyDistrict
let other: ReadyDistrict

beforeAll(async () => {
  app = await startTestApp()
  district = await makeReadyDistrict(app, 'Sable Basin District (example)')
  other = await makeReadyDistrict(app, 'Tarn Hollow District (example)')
})
/** Failures of one address are counted over all accounts, and every test here comes from the same. */
afterEach(() =>
  app.nest.get(UnitOfWork).runForAccounts(({ manager }) => manager.query('delete from sign_in_attempts')),
)
afterAll(() => app.stop())

const tryIn = (email: string, password: string) => app.client().post('/session', { email, password })

const setCookie = ({ headers }: Response): string[] => [headers['set-cookie'] ?? []].flat()

const isIn = async (api: ApiClient): Promise<boolean> => (await api.get('/session')).status === 200

const withoutRequestId = ({ text }: Response) => ({ ...JSON.parse(text), requestId: null })

describe('signing in', () => {
  it('answers who one is, in which district and as what', async () => {
    const { personId, email, name } = district.planner
    const { body } = await tryIn(email.toUpperCase(), testPassword).expect(201)
    expect(body).toMatchObject({
      personId,
      name,
      email,
      roles: ['planner'],
      jobId: null,
      district: { id: district.districtId },
      memberships: [{ districtId: district.districtId, roles: ['planner'] }],
    })
    expect(JSON.stringify(body)).not.toContain('password')
  })

  it('sets one cookie that no script, no other host and no plain connection gets', async () => {
    const [cookie, ...more] = setCookie(await tryIn(district.planner.email, testPassword).expect(201))
    expect(more).toEqual([])
    const [pair = '', ...attributes] = (cookie ?? '').split('; ')
    expect(pair).toMatch(/^__Host-wadestone=[\w-]+\.[\w-]+\.[\w-]+$/)
    expect(attributes.filter((text) => !/^(Max-Age|Expires)=/.test(text)).sort()).toEqual([
      'HttpOnly',
      'Path=/',
      'SameSite=Lax',
      'Secure',
    ])
  })

  it('with a wrong password is answered as with an e-mail nobody has', async () => {
    const wrong = await tryIn(district.office.email, 'not the password of anybody')
    const unknown = await tryIn('nobody.at.all@people.example', 'not the password of anybody')
    expectProblem(wrong, 'wrong-sign-in')
    expect(withoutRequestId(unknown)).toEqual(withoutRequestId(wrong))
    expect([...setCookie(wrong), ...setCookie(unknown)]).toEqual([])
  })

  it('is refused to a person without a password and to one who left, in the same words', async () => {
    const guest = await addMember(app, district.districtId, { name: 'Gil Passeau', roles: ['planner'] })
    const wrong = await tryIn(guest.email, testPassword)
    expectProblem(wrong, 'wrong-sign-in')
    const { personId, email } = other.checker
    await app.inDistrict(other.districtId, ({ manager }) =>
      manager.update(Membership, { personId }, { isActive: false }),
    )
    expect(withoutRequestId(await tryIn(email, testPassword))).toEqual(withoutRequestId(wrong))
    expect(await isIn(other.checker.api)).toBe(false)
  })

  it('after five failures makes even the owner wait, for longer each time, and then lets in again', async () => {
    const { email } = district.supervisor
    for (let failure = 1; failure <= 5; failure++) expectProblem(await tryIn(email, 'wrong'), 'wrong-sign-in')
    const first = await tryIn(email, testPassword)
    expectProblem(first, 'too-many-tries')
    expect(first.headers['retry-after']).toBe('1')
    app.clock.moveOn(1_100)
    expectProblem(await tryIn(email, 'wrong'), 'wrong-sign-in')
    const second = await tryIn(email, testPassword)
    expectProblem(second, 'too-many-tries')
    expect(second.headers['retry-after']).toBe('2')
    await tryIn(district.office.email, testPassword).expect(201)
    app.clock.moveOn(2_100)
    await tryIn(email, testPassword).expect(201)
  })
})

describe('a session', () => {
  it('is needed: a missing, foreign, unsigned, torn or expired cookie is asked to sign in', async () => {
    const { personId } = district.planner
    const { api, sessionId } = await openSession(app, { personId, districtId: district.districtId })
    const unsigned = [
      { alg: 'none', typ: 'JWT' },
      { sid: sessionId, sub: personId, aud: 'wadestone' },
    ]
    const past = new Date(Date.now() - 16 * 60_000)
    const cookies = [
      '',
      forgeCookie(app, { personId, sessionId, issuedAt: past }),
      forgeCookie(app, { personId, sessionId, secret: 'a secret of somebody else, long enough' }),
      forgeCookie(app, { personId: other.planner.personId, sessionId }),
      forgeCookie(app, { personId, sessionId: randomUUID() }),
      `__Host-wadestone=${unsigned.map((part) => Buffer.from(JSON.stringify(part)).toString('base64url')).join('.')}.`,
      api.cookie.slice(0, -4),
    ]
    for (const cookie of cookies) {
      const stranger = app.client()
      stranger.cookie = cookie
      expectProblem(await stranger.get('/jobs'), 'not-signed-in')
    }
    await api.get('/jobs').expect(200)
  })

  it('ends for its cookie when one signs out', async () => {
    const { api } = await openSession(app, { ...district.office, districtId: district.districtId })
    const { cookie } = api
    const [cleared] = setCookie(await api.delete('/session').expect(204))
    expect(cleared).toMatch(/^__Host-wadestone=;.*Expires=Thu, 01 Jan 1970/)
    api.cookie = cookie
    expectProblem(await api.get('/session'), 'not-signed-in')
  })

  it('that another one of the same person ends is refused from the next request on', async () => {
    const where = { ...district.office, districtId: district.districtId }
    const [kept, ended] = [await openSession(app, where), await openSession(app, where)]
    const { body } = await kept.api.get('/sessions').expect(200)
    expect(body).toEqual(
      expect.arrayContaining([
        expect.objectContaining({ id: kept.sessionId, isThis: true }),
        expect.objectContaining({ id: ended.sessionId, isThis: false }),
      ]),
    )
    await kept.api.delete(`/sessions/${ended.sessionId}`).expect(204)
    expectProblem(await ended.api.get('/jobs'), 'not-signed-in')
    expectProblem(await ended.api.post('/producers', {}), 'not-signed-in')
    expect(await isIn(kept.api)).toBe(true)
  })

  it('has its token written anew after a minute, and not before', async () => {
    const { api } = await openSession(app, { ...district.planner, districtId: district.districtId })
    const before = api.cookie
    app.clock.moveOn(61_000)
    const renewed = await api.get('/session').expect(200)
    expect(setCookie(renewed)).toHaveLength(1)
    expect(await isIn(api)).toBe(true)
    app.clock.moveOn(-61_000)
    api.cookie = before
    expect(setCookie(await api.get('/session').expect(200))).toEqual([])
  })

  it('ends twelve hours after it began, however busy', async () => {
    const { api } = await openSession(app, { ...district.planner, districtId: district.districtId })
    app.clock.moveOn(11.9 * 3_600_000)
    expect(await isIn(api)).toBe(true)
    app.clock.moveOn(0.2 * 3_600_000)
    expect(await isIn(api)).toBe(false)
    app.clock.moveOn(-12.1 * 3_600_000)
  })

  it('has the roles of today, and none after the person left', async () => {
    const { districtId } = district
    const member = await addMember(app, districtId, { name: 'Noor Halden', roles: ['office'] })
    expectProblem(await member.api.post('/jobs', {}), 'forbidden')
    await giveRoles(app, districtId, { ...member, roles: ['planner'] })
    expectProblem(await member.api.post('/jobs', {}), 'invalid-fields')
    await app.inDistrict(districtId, ({ manager }) =>
      manager.update(Membership, { personId: member.personId }, { isActive: false }),
    )
    expectProblem(await member.api.get('/jobs'), 'not-signed-in')
  })

  it('moves only to a district one belongs to, and then sees that one alone', async () => {
    const { personId, api } = await addMember(app, district.districtId, {
      name: 'Vera Lund',
      roles: ['office'],
    })
    expectProblem(await api.put('/session/district', { districtId: other.districtId }), 'not-found')
    await app.inDistrict(other.districtId, (tx) =>
      withAccounts(tx, ({ manager, at }) =>
        manager.insert(Membership, {
          districtId: tx.districtId,
          personId,
          roles: ['planner'],
          approvalLimits: null,
          isActive: true,
          createdAt: at,
        }),
      ),
    )
    const producer = { name: 'Hale Orne', farmName: 'Orne Farm' }
    const { body: left } = await api.post('/producers', producer).expect(201)
    const { body } = await api.put('/session/district', { districtId: other.districtId }).expect(200)
    expect(body).toMatchObject({ district: { id: other.districtId }, roles: ['planner'] })
    expectProblem(await api.get(`/producers/${left.id}`), 'not-found')
    expectProblem(await api.put('/session/district', { districtId: randomUUID() }), 'not-found')
  })
})

describe('a password', () => {
  const change = (api: ApiClient, currentPassword: string, newPassword: string) =>
    api.post('/account/password', { currentPassword, newPassword })

  it('that is changed signs every other session of the person out', async () => {
    const { email } = district.administrator
    const here = await app.client().signIn({ email, password: testPassword })
    const newer = 'another sentence long enough for a test'
    await change(here, testPassword, newer).expect(204)
    expect(await isIn(here)).toBe(true)
    expect(await isIn(district.administrator.api)).toBe(false)
    expectProblem(await tryIn(email, testPassword), 'wrong-sign-in')
    await tryIn(email, newer).expect(201)
  })

  it('of 128 characters counts to the last of them, though bcrypt reads but 72', async () => {
    const { api, email } = district.checker
    const start = 'the quick brown heifers walk down to the pond each morning, one by one; '.padEnd(127, 'x')
    await change(api, testPassword, `${start}a`).expect(204)
    expectProblem(await tryIn(email, `${start}b`), 'wrong-sign-in')
    await tryIn(email, `${start}a`).expect(201)
  })

  it('is not changed by who does not know it, nor to a short or guessable one', async () => {
    const { api, name } = district.planner
    const newer = 'a third sentence long enough for a test'
    const tries = [
      ['/currentPassword', await change(api, 'not the one used now', newer)],
      ['/newPassword', await change(api, testPassword, 'fourteen signs')],
      ['/newPassword', await change(api, testPassword, `${name} ${name} 1`)],
      ['/newPassword', await change(api, testPassword, 'passwordpassword1')],
    ] as const
    for (const [pointer, answer] of tries) {
      expect(pointersOf(expectProblem(answer, 'invalid-fields'))).toEqual([pointer])
    }
    await tryIn(district.planner.email, testPassword).expect(201)
  })
})
