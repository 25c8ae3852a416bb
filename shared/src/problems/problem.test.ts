import { describe, expect, it } from 'vitest'
import { problemCatalogue, type ProblemSlug } from './catalogue.js'
import { Problem, problemDocument, problemSlug } from './problem.js'

describe('a problem document', () => {
  it('carries type, title, status and what the thrower said (RFC 9457 members)', () => {
    const problem = new Problem('stale-version', { detail: 'Ines saved version 4.', current: { version: 4 } })
    expect(problemDocument(problem, 'r-1')).toEqual({
      type: 'urn:wadestone:problem:stale-version',
      title: 'Someone saved a newer version',
      status: 412,
      detail: 'Ines saved version 4.',
      current: { version: 4 },
      requestId: 'r-1',
    })
  })

  it('is recognised again for every slug of the catalogue, and nothing else is', () => {
    for (const slug of Object.keys(problemCatalogue) as ProblemSlug[]) {
      expect(problemSlug(problemDocument(new Problem(slug)))).toBe(slug)
    }
    for (const other of [null, 'x', {}, { type: 'about:blank' }]) expect(problemSlug(other)).toBeNull()
  })

  it('uses only client and server error statuses', () => {
    for (const { status } of Object.values(problemCatalogue)) {
      expect(status).toBeGreaterThanOrEqual(400)
      expect(status).toBeLessThan(600)
    }
  })
})
