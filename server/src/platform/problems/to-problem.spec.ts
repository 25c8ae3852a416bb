import { BadRequestException, HttpException, NotFoundException } from '@nestjs/common'
import { Problem, problemDocument, type ProblemSlug } from 'shared'
import { QueryFailedError } from 'typeorm'
import { toProblem } from './to-problem'

const sql = 'INSERT INTO job_secret (title) VALUES ($1)'
const fromDatabase = (code?: string): QueryFailedError =>
  new QueryFailedError(
    sql,
    ['Alder Fork'],
    Object.assign(new Error('relation job_secret'), code === undefined ? {} : { code }),
  )
const withMembers = (members: object): Error => Object.assign(new Error('job_secret'), members)

const thrownThings: readonly (readonly [string, unknown, ProblemSlug])[] = [
  ['a problem of our own', new Problem('stale-version'), 'stale-version'],
  ['a framework 400', new BadRequestException(), 'malformed-request'],
  ['a framework 404', new NotFoundException(), 'not-found'],
  ['a framework status nobody planned for', new HttpException('teapot', 418), 'unexpected'],
  ['a body parser 413', withMembers({ status: 413 }), 'body-too-large'],
  ['an upload over its limit', withMembers({ code: 'LIMIT_FILE_SIZE' }), 'body-too-large'],
  ['a database that is down', withMembers({ code: 'ECONNREFUSED' }), 'not-ready'],
  ['a pool without a free connection', new Error('timeout exceeded when trying to connect'), 'not-ready'],
  ['a sign that the encoding has not (22021)', fromDatabase('22021'), 'malformed-request'],
  ['a NUL in JSON (22P05)', fromDatabase('22P05'), 'malformed-request'],
  ['half a character in JSON, or no uuid (22P02)', fromDatabase('22P02'), 'malformed-request'],
  ['a number too large for its column (22003)', fromDatabase('22003'), 'malformed-request'],
  ['a date that is none (22008)', fromDatabase('22008'), 'malformed-request'],
  ['a row that is there already (23505)', fromDatabase('23505'), 'already-exists'],
  ['a serialisation that failed (40001)', fromDatabase('40001'), 'not-ready'],
  ['a deadlock (40P01)', fromDatabase('40P01'), 'not-ready'],
  ['a syntax fault of ours (42601)', fromDatabase('42601'), 'unexpected'],
  ['a constraint that we broke (23502)', fromDatabase('23502'), 'unexpected'],
  ['a database error without a code', fromDatabase(), 'unexpected'],
  ['an error nobody knows', new Error('job_secret'), 'unexpected'],
  ['a thrown text', 'job_secret', 'unexpected'],
  ['nothing', undefined, 'unexpected'],
]

describe('what was thrown becomes a problem of the catalogue', () => {
  it.each(thrownThings)('%s', (_, thrown, slug) => {
    const problem = toProblem(thrown)
    expect(problem.slug).toBe(slug)
  })

  it.each(thrownThings)('without a word of the inside: %s', (_, thrown) => {
    const written = JSON.stringify(problemDocument(toProblem(thrown), 'r-1'))
    expect(written).not.toMatch(/INSERT|job_secret|Alder Fork|timeout exceeded|teapot|\d{2}[P0]\d{2}/)
  })
})
