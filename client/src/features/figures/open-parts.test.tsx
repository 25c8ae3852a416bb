import { render, screen, within } from '@testing-library/react'
import { MemoryRouter } from 'react-router-dom'
import { designParts, type DesignView, type PartFailed, type PartWaiting } from 'shared'
import { describe, expect, it } from 'vitest'
import { OpenParts } from './open-parts'

const designWith = (open: { [part: string]: PartFailed | PartWaiting }): DesignView => {
  const parts = designParts.map((part) => [part, open[part] ?? { ok: true, value: null }])
  return { id: 'd1', jobId: 'j1', name: 'one', result: Object.fromEntries(parts) } as DesignView
}

const show = (design: DesignView) =>
  render(
    <MemoryRouter>
      <OpenParts design={design} />
    </MemoryRouter>,
  )

describe('parts that are not worked out', () => {
  it('let a waiting part lead to its own place in the design and to what it waits for', () => {
    show(designWith({ rock: { ok: false, waitingFor: ['profile'] } }))
    const line = screen.getByRole('listitem')
    expect(line).toHaveTextContent('waiting')
    expect(within(line).getByRole('link', { name: 'Rock' })).toHaveAttribute(
      'href',
      '/jobs/j1/design/d1/rock',
    )
    expect(within(line).getByRole('link', { name: 'Ramp' })).toHaveAttribute(
      'href',
      '/jobs/j1/design/d1/ramp',
    )
  })

  it('say the sentence of a part that misses an input and lead to where it is entered', () => {
    const message = 'The district setting "Swell of excavated earth" is still empty.'
    show(designWith({ earthwork: { ok: false, field: 'settings.swellPercent', message } }))
    const line = screen.getByRole('listitem')
    expect(line).toHaveTextContent(message)
    expect(within(line).getByRole('link', { name: 'Go there' })).toHaveAttribute('href', '/settings')
  })

  it('lead a missing ground line to the survey, since no plan holds it', () => {
    const message = 'Enter the ground line first.'
    show(designWith({ profile: { ok: false, field: 'site.groundLine', message } }))
    expect(screen.getByRole('link', { name: 'Go there' })).toHaveAttribute('href', '/jobs/j1/survey')
  })

  it('show nothing when every part is worked out', () => {
    const { container } = show(designWith({}))
    expect(container).toBeEmptyDOMElement()
  })
})
