import { describe, expect, it } from 'vitest'
import { safeReturnPath } from './safe-return-path'

describe('safeReturnPath', () => {
  it('leads back to a page of our own', () => {
    expect(safeReturnPath('/jobs/1/survey?x=1')).toBe('/jobs/1/survey?x=1')
  })

  it.each([
    null,
    '',
    'https://example.org',
    '//example.org',
    '/\\example.org',
    'jobs',
    '/sign-in?to=/sign-in',
  ])('leads home instead of to %s', (to) => {
    expect(safeReturnPath(to)).toBe('/')
  })
})
