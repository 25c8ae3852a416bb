import { render, screen } from '@testing-library/react'
import type { CheckResult } from 'shared'
import { describe, expect, it } from 'vitest'
import { CheckFilter } from './check-filter'
import { CheckList } from './check-list'

const check = (id: string, rest: Partial<CheckResult>): CheckResult => ({
  id,
  practice: '614',
  title: id,
  comparison: 'at-least',
  actual: 12,
  limit: 10,
  unit: 'ft',
  verdict: 'pass',
  source: 'a published source',
  note: '',
  ...rest,
})

const checks = [
  check('Width', {}),
  check('Reach', { verdict: 'not-applicable', actual: null, limit: null }),
  check('Frontage', { verdict: 'caution', actual: 8 }),
  check('Grade', { verdict: 'fail', actual: 4, limit: 6, unit: 'run per rise' }),
]

const plainText = (element: HTMLElement) => element.textContent?.replace(/\u00a0/g, ' ') ?? ''

describe('checks', () => {
  it('put the failing check first, with its word, what it has and what it needs', () => {
    render(<CheckList checks={checks} />)
    const [first, second] = screen.getAllByRole('listitem').map(plainText)
    expect(first).toContain('fails')
    expect(first).toContain('Grade')
    expect(first).toContain('has 4 : 1, needs at least 6 : 1')
    expect(second).toContain('caution')
  })

  it('never call a check without a figure or a limit anything but not judged', () => {
    render(<CheckList checks={checks} />)
    const last = plainText(screen.getAllByRole('listitem').at(-1) as HTMLElement)
    expect(last).toContain('does not apply')
    expect(last).toContain('not worked out, no limit set')
  })

  it('say of a yes-or-no check whether it is met, since "has no" could be read both ways', () => {
    const wire = check('No wire in the water', {
      comparison: 'yes',
      actual: false,
      limit: null,
      verdict: 'fail',
    })
    render(<CheckList checks={[wire]} />)
    expect(screen.getByText('not met')).toBeInTheDocument()
    expect(screen.queryByText(/no limit set|needs/)).not.toBeInTheDocument()
  })

  it('count each verdict by word on top', () => {
    render(<CheckFilter checks={checks} shown="fail" onShow={() => undefined} />)
    expect(screen.getByRole('button', { name: '1 fails' })).toHaveAttribute('aria-pressed', 'true')
    expect(screen.getByRole('button', { name: '1 holds' })).toHaveAttribute('aria-pressed', 'false')
  })
})
