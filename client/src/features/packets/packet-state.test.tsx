import { QueryClient, QueryClientProvider } from '@tanstack/react-query'
import { render, screen } from '@testing-library/react'
import { afterEach, describe, expect, it, vi } from 'vitest'
import type { PacketView, SessionView } from 'shared'
import { SessionContext } from '../../api/session-context'
import { PacketState } from './packet-state'

const packet = (change: Partial<PacketView>) => ({ id: 'k1', jobId: 'j1', kind: 'A', revision: 2, ...change })

const answer = (body: unknown) => new Response(JSON.stringify(body), { status: 200 })

const session = { personId: 'p1', roles: ['planner'], district: { id: 'd1' } } as unknown as SessionView

const show = () =>
  render(
    <QueryClientProvider client={new QueryClient()}>
      <SessionContext value={session}>
        <PacketState packetId="k1" isJobBehind>
          {({ revision }) => <p>Revision {revision} is here</p>}
        </PacketState>
      </SessionContext>
    </QueryClientProvider>,
  )

afterEach(() => vi.unstubAllGlobals())

describe('a packet', () => {
  it('shows progress while it is made and itself once it is, without a reload', async () => {
    const fetched = vi
      .fn()
      .mockResolvedValueOnce(answer(packet({ status: 'making' })))
      .mockImplementation(async () => answer(packet({ status: 'ready' })))
    vi.stubGlobal('fetch', fetched)
    show()
    expect(await screen.findByRole('progressbar')).toHaveAccessibleName(/revision 2 is being made/)
    expect(await screen.findByText('Revision 2 is here', {}, { timeout: 3000 })).toBeInTheDocument()
  })

  it('says in a sentence that it could not be made and what to do', async () => {
    vi.stubGlobal(
      'fetch',
      vi.fn().mockImplementation(async () => answer(packet({ status: 'failed' }))),
    )
    show()
    expect(await screen.findByRole('alert')).toHaveTextContent(/revision 2 could not be made/)
    expect(screen.getByRole('button', { name: 'Make it again' })).toBeEnabled()
  })
})
