import { QueryClient, QueryClientProvider } from '@tanstack/react-query'
import { render, screen } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { afterEach, describe, expect, it, vi } from 'vitest'
import type { JobView, PacketView, SessionView } from 'shared'
import { SessionContext } from '../../api/session-context'
import { changeLanguage } from '../../i18n/i18n'
import { SignForm } from './sign-form'

const sha256 = 'b'.repeat(64)
const session = { name: 'June A. Pickard' } as SessionView
const job = {
  id: 'j1',
  actions: [{ action: 'sign', words: 'Sign', enabled: false, reasons: [] }],
} as unknown as JobView

const packet = (change: Partial<PacketView> = {}): PacketView =>
  ({
    id: 'p1',
    revision: 2,
    status: 'ready',
    sha256,
    iHaveConsented: true,
    pages: [1, 2].map((number) => ({ number, title: `Page ${number}`, text: [] })),
    pagesReadByMe: [1, 2],
    ...change,
  }) as PacketView

function show(shown: PacketView, offered = job) {
  const fetched = vi.fn().mockResolvedValue(Response.json({ ...job, state: 'with-supervisor' }))
  vi.stubGlobal('fetch', fetched)
  const onSigned = vi.fn()
  render(
    <QueryClientProvider client={new QueryClient()}>
      <SessionContext value={session}>
        <SignForm job={offered} packet={shown} onSigned={onSigned} />
      </SessionContext>
    </QueryClientProvider>,
  )
  return { fetched, onSigned, button: screen.getByRole('button', { name: 'Sign revision 2' }) }
}

const tick = () => screen.getByRole('checkbox', { name: /mean my typed name as my signature/ })

afterEach(async () => {
  vi.unstubAllGlobals()
  await changeLanguage('en')
})

describe('the sign button', () => {
  it('says everything that is still missing, and does nothing', async () => {
    const { button, fetched } = show(packet({ iHaveConsented: false, pagesReadByMe: [1] }))
    expect(button).toHaveAttribute('aria-disabled', 'true')
    const missing =
      /Agree to electronic records.*One page is not read yet.*Type your full name.*Tick that you mean this/
    expect(button).toHaveAccessibleDescription(missing)
    await userEvent.click(button)
    expect(fetched).not.toHaveBeenCalled()
  })

  it('drops each reason as it is done', async () => {
    const { button } = show(packet())
    await userEvent.type(screen.getByLabelText('Type your full name'), 'June A. Pickard')
    expect(button).toHaveAccessibleDescription('Tick that you mean this as your signature')
    await userEvent.click(tick())
    expect(button).toHaveAttribute('aria-disabled', 'false')
  })

  it('says a reason of the server in the language of the page', async () => {
    await changeLanguage('es')
    const reasons = ['You are not a signer of this job.']
    const offered = {
      ...job,
      actions: [{ action: 'sign', words: 'Sign', enabled: false, reasons }],
    } as JobView
    vi.stubGlobal('fetch', vi.fn())
    render(
      <QueryClientProvider client={new QueryClient()}>
        <SessionContext value={session}>
          <SignForm job={offered} packet={packet()} onSigned={vi.fn()} />
        </SessionContext>
      </QueryClientProvider>,
    )
    expect(screen.getByRole('button', { name: 'Firmar la revisión 2' })).toHaveAccessibleDescription(
      /Usted no firma en este trabajo\./,
    )
  })

  it('signs the very packet that was read, with the typed name and the tick', async () => {
    const { button, fetched, onSigned } = show(packet())
    await userEvent.type(screen.getByLabelText('Type your full name'), '  June A. Pickard ')
    await userEvent.click(tick())
    await userEvent.click(button)
    const [path, options] = fetched.mock.calls[0] ?? []
    expect(path).toBe('/api/jobs/j1/acts')
    expect(JSON.parse(options.body)).toEqual({
      action: 'sign',
      typedName: 'June A. Pickard',
      intends: true,
      packetSha256: sha256,
    })
    expect(onSigned).toHaveBeenCalledWith(expect.objectContaining({ state: 'with-supervisor' }))
  })
})
