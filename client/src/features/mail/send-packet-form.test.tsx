import { QueryClient, QueryClientProvider } from '@tanstack/react-query'
import { render, screen } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import type { JobView, OfferedAction } from 'shared'
import { afterEach, describe, expect, it, vi } from 'vitest'
import { SendPacketForm } from './send-packet-form'

const job = (offered: Partial<OfferedAction>) =>
  ({
    id: 'j1',
    actions: [{ action: 'send', words: 'Send the packet', enabled: true, reasons: [], ...offered }],
  }) as unknown as JobView

const show = (shown: JobView) => {
  const fetched = vi.fn().mockImplementation(async () => new Response(JSON.stringify(shown), { status: 200 }))
  vi.stubGlobal('fetch', fetched)
  render(
    <QueryClientProvider client={new QueryClient()}>
      <SendPacketForm job={shown} />
    </QueryClientProvider>,
  )
  return fetched
}

afterEach(() => vi.unstubAllGlobals())

describe('sending the approved packet', () => {
  it('sends nothing before the addresses are confirmed, and says so', async () => {
    const fetched = show(job({}))
    await userEvent.click(screen.getByRole('button', { name: 'Send the packet' }))
    expect(await screen.findByRole('alert')).toHaveTextContent('Tick that the addresses are right')
    expect(fetched).not.toHaveBeenCalled()
  })

  it('sends the act with the confirmation', async () => {
    const fetched = show(job({}))
    await userEvent.click(screen.getByRole('checkbox'))
    await userEvent.click(screen.getByRole('button', { name: 'Send the packet' }))
    await vi.waitFor(() => expect(fetched).toHaveBeenCalledTimes(1))
    expect(JSON.parse(fetched.mock.calls[0]?.[1].body)).toEqual({ action: 'send', addressConfirmed: true })
  })

  it('stays in place with its reasons while the packet is not made', () => {
    show(
      job({ enabled: false, reasons: ['The approved packet is still being made. Try again in a moment.'] }),
    )
    const button = screen.getByRole('button', { name: 'Send the packet' })
    expect(button).toHaveAttribute('aria-disabled', 'true')
    expect(button).toHaveAccessibleDescription(/still being made/)
  })
})
