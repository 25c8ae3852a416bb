import { describe, expect, it } from 'vitest'
import { isCertainRefusal, noConnection, parseProblem } from './problem-error'

describe('parseProblem', () => {
  it('keeps the sentence, the fields, the reasons and the request id of a problem document', () => {
    const error = parseProblem(422, {
      type: 'urn:wadestone:problem:invalid-fields',
      title: 'Some fields need another look',
      status: 422,
      detail: 'The grade is out of range.',
      fields: [{ pointer: '/plan/ramp/gradeRunPerRise', message: 'Must be at least 2 run per rise' }],
      reasons: ['One reason.'],
      requestId: 'r-1',
    })
    expect(error.slug).toBe('invalid-fields')
    expect(error.message).toBe('The grade is out of range.')
    expect(error.fields).toEqual([
      { pointer: '/plan/ramp/gradeRunPerRise', message: 'Must be at least 2 run per rise' },
    ])
    expect(error.reasons).toEqual(['One reason.'])
    expect(error.requestId).toBe('r-1')
  })

  it('falls back on the title when a problem has no detail', () => {
    const body = {
      type: 'urn:wadestone:problem:not-found',
      title: 'There is nothing here for you',
      status: 404,
    }
    expect(parseProblem(404, body).message).toBe('There is nothing here for you')
  })

  it('hands on the newer document of a stale version', () => {
    const body = {
      type: 'urn:wadestone:problem:stale-version',
      title: 'Someone saved a newer version',
      status: 412,
      current: { version: 4 },
    }
    expect(parseProblem(412, body).current).toEqual({ version: 4 })
  })

  it.each([
    [502, '<html>bad gateway</html>', 'unexpected'],
    [503, null, 'not-ready'],
    [413, undefined, 'body-too-large'],
    [500, { type: 'about:blank' }, 'unexpected'],
    [500, { type: 'urn:wadestone:problem:no-such-slug' }, 'unexpected'],
  ])('answers %i with a body that is no problem document by %s → %s', (status, body, slug) => {
    const error = parseProblem(status, body)
    expect(error.slug).toBe(slug)
    expect(error.message).toContain('Nothing you typed is lost')
  })
})

describe('isCertainRefusal', () => {
  it('is true only when the server surely did not act', () => {
    const refused = parseProblem(409, {
      type: 'urn:wadestone:problem:transition-not-allowed',
      title: 'No',
      status: 409,
    })
    const running = parseProblem(409, {
      type: 'urn:wadestone:problem:still-running',
      title: 'Wait',
      status: 409,
    })
    expect(isCertainRefusal(refused)).toBe(true)
    expect(isCertainRefusal(running)).toBe(false)
    expect(isCertainRefusal(noConnection())).toBe(false)
    expect(isCertainRefusal(parseProblem(500, null))).toBe(false)
  })
})
