import { QueryClient, QueryClientProvider } from '@tanstack/react-query'
import { render, screen } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { afterEach, describe, expect, it, vi } from 'vitest'
import type { JobView } from 'shared'
import { SendToLandowner } from './send-to-landowner'

const job = (change: Partial<JobView>): JobView =>
  ({
    id: 'j1',
    state: 'draft',
    waitsFor: 'the landowner’s signature',
    producers: [{ id: 'p1', name: 'June Pickard', farmName: 'Pickard' }],
    actions: [{ action: 'send-to-landowner', words: 'Send to landowner', enabled: true, reasons: [] }],
    ...change,
  }) as JobView

const blocked = job({
  actions: [
    {
      action: 'send-to-landowner',
      words: 'Send to landowner',
      enabled: false,
      reasons: [
        'The technical check of this packet is not done yet.',
        '2 notes are still open. Answer and settle each.',
      ],
    },
  ],
})

const show = (shown: JobView) => {
  const fetched = vi.fn().mockResolvedValue(new Response(JSON.stringify(shown), { status: 200 }))
  vi.stubGlobal('fetch', fetched)
  render(
    <QueryClientProvider client={new QueryClient()}>
      <SendToLandowner job={shown} />
    </QueryClientProvider>,
  )
  return fetched
}

afterEach(() => vi.unstubAllGlobals())

describe('sending to the landowner', () => {
  it('keeps the blocked button in place with every reason beside it, and does nothing when pressed', async () => {
    const fetched = show(blocked)
    const button = screen.getByRole('button', { name: 'Send to landowner' })
    expect(button).toHaveAttribute('aria-disabled', 'true')
    expect(button).toHaveAccessibleDescription(/technical check.*2 notes are still open/)
    await userEvent.click(button)
    expect(fetched).not.toHaveBeenCalled()
  })

  it('sends one act with a key, so that a second press is the same intention', async () => {
    const fetched = show(job({}))
    await userEvent.click(screen.getByRole('button', { name: 'Send to landowner' }))
    const [path, options] = fetched.mock.calls[0] ?? []
    expect(path).toBe('/api/jobs/j1/acts')
    expect(JSON.parse(options.body)).toEqual({ action: 'send-to-landowner' })
    expect(options.headers.get('Idempotency-Key')).toMatch(/^[0-9a-f-]{36}$/)
  })

  it('says whom the job waits for when this person has nothing to send', () => {
    show(job({ state: 'with-landowner', actions: [] }))
    expect(screen.getByRole('status')).toHaveTextContent('It waits for: the landowner’s signature.')
    expect(screen.queryByRole('button')).not.toBeInTheDocument()
  })
})
