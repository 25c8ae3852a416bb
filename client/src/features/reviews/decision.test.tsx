import { QueryClient, QueryClientProvider } from '@tanstack/react-query'
import { render, screen } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import type { JobView, OfferedAction, PacketView } from 'shared'
import { afterEach, describe, expect, it, vi } from 'vitest'
import { Decision } from './decision'

const sha256 = 'ab'.repeat(32)
const pages = Array.from({ length: 9 }, (_, index) => ({ number: index + 1, title: 'Page', text: [] }))
const packet = { id: 'k1', jobId: 'j1', revision: 2, sha256, pages } as unknown as PacketView

const act = (action: 'approve' | 'return', rest: Partial<OfferedAction> = {}): OfferedAction => ({
  action,
  words: action === 'approve' ? 'Approve' : 'Return with notes',
  enabled: true,
  reasons: [],
  ...rest,
})

const show = (actions: OfferedAction[]) => {
  const job = { id: 'j1', state: 'with-supervisor', waitsFor: 'the approval', actions } as unknown as JobView
  const fetched = vi.fn().mockImplementation(async () => new Response(JSON.stringify(job), { status: 200 }))
  vi.stubGlobal('fetch', fetched)
  render(
    <QueryClientProvider client={new QueryClient()}>
      <Decision job={job} packet={packet} />
    </QueryClientProvider>,
  )
  return async () => {
    await vi.waitFor(() => expect(fetched).toHaveBeenCalledTimes(1))
    return JSON.parse(fetched.mock.calls[0]?.[1].body)
  }
}

afterEach(() => vi.unstubAllGlobals())

describe('the decision', () => {
  it('approves the very packet that was read, and only after it was confirmed', async () => {
    const sent = show([act('approve')])
    await userEvent.click(screen.getByRole('button', { name: 'Approve revision 2' }))
    const dialog = await screen.findByRole('dialog', { name: 'Approve revision 2?' })
    expect(dialog).toHaveTextContent('cannot be undone')
    expect(fetch).not.toHaveBeenCalled()
    await userEvent.click(screen.getByRole('button', { name: 'Approve revision 2' }))
    expect(await sent()).toEqual({ action: 'approve', packetSha256: sha256 })
  })

  it('keeps a blocked approval in place with its reasons', () => {
    show([act('approve', { enabled: false, reasons: ['You made this design. Another person must decide.'] })])
    const button = screen.getByRole('button', { name: 'Approve' })
    expect(button).toHaveAttribute('aria-disabled', 'true')
    expect(button).toHaveAccessibleDescription('You made this design. Another person must decide.')
  })

  it('returns with every note, each with its page', async () => {
    const sent = show([act('return')])
    await userEvent.type(screen.getByLabelText('Note 1', { selector: 'textarea' }), 'Raise the top.')
    await userEvent.type(screen.getByLabelText(/^Page/), '4')
    await userEvent.click(screen.getByRole('button', { name: 'One more note' }))
    await userEvent.type(
      screen.getByLabelText('Note 2', { selector: 'textarea' }),
      'Use the rain of the site.',
    )
    await userEvent.click(screen.getByRole('button', { name: 'Return with notes' }))
    expect(await sent()).toEqual({
      action: 'return',
      notes: ['Page 4: Raise the top.', 'Use the rain of the site.'],
    })
  })

  it('returns nothing without a note or with a page that is not there, and says what would be right', async () => {
    show([act('return')])
    await userEvent.type(screen.getByLabelText(/^Page/), '12')
    await userEvent.click(screen.getByRole('button', { name: 'Return with notes' }))
    const alert = await screen.findByRole('alert')
    expect(alert).toHaveTextContent('This must not be empty')
    expect(alert).toHaveTextContent('Give a page from 1 to 9')
    expect(fetch).not.toHaveBeenCalled()
  })

  it('says whom the job waits for when there is nothing to decide', () => {
    show([])
    expect(screen.getByRole('status')).toHaveTextContent('Nothing waits for your decision.')
  })
})
