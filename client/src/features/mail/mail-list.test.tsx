import { QueryClient, QueryClientProvider } from '@tanstack/react-query'
import { render, screen } from '@testing-library/react'
import type { MailView, SessionView } from 'shared'
import { describe, expect, it } from 'vitest'
import { SessionContext } from '../../api/session-context'
import { addressText } from './addressees'
import { MailList } from './mail-list'

const session = {
  personId: 'p1',
  roles: ['office'],
  district: { id: 'd1', timeZone: 'America/Chicago' },
} as unknown as SessionView

const mail = (id: string, rest: Partial<MailView>): MailView => ({
  id,
  kind: 'packet',
  to: 'june@example.org',
  subject: `Packet ${id}`,
  messageId: `<${id}@example.org>`,
  status: 'sent',
  attempts: 1,
  queuedAt: `2026-05-2${id}T15:00:00.000Z`,
  sentAt: null,
  lastError: null,
  isSecret: false,
  attachment: null,
  ...rest,
})

const show = (list: MailView[]) =>
  render(
    <QueryClientProvider client={new QueryClient()}>
      <SessionContext value={session}>
        <MailList jobId="j1" mail={list} />
      </SessionContext>
    </QueryClientProvider>,
  )

describe('the mail of a job', () => {
  it('says of a failed message that it failed, how often it was tried and what the mail server said', () => {
    show([mail('1', { status: 'failed', attempts: 3, lastError: '550 no such mailbox' })])
    const line = screen.getByRole('listitem')
    expect(line).toHaveTextContent('failed')
    expect(line).toHaveTextContent(
      'It could not be delivered; it was tried 3 times. The mail server said: 550 no such mailbox',
    )
  })

  it('offers a failed message again, unless it carried a way in or did not fail', () => {
    show([
      mail('1', { status: 'failed' }),
      mail('2', { status: 'failed', isSecret: true }),
      mail('3', { status: 'sent' }),
    ])
    const [sent, secret, failed] = screen.getAllByRole('listitem')
    expect(failed).toHaveTextContent('Send it again')
    expect(secret).not.toHaveTextContent('Send it again')
    expect(sent).not.toHaveTextContent('Send it again')
  })

  it('says of a message that waits after a failed try that it will be tried again', () => {
    show([mail('1', { status: 'waiting', lastError: '451 try later' })])
    expect(screen.getByText(/tried once and will be tried again.*451 try later/)).toBeInTheDocument()
  })

  it('adds no sentence to a message that went out, and puts the newest first', () => {
    show([mail('1', {}), mail('2', {})])
    expect(screen.queryByText(/mail server said/)).not.toBeInTheDocument()
    expect(screen.getAllByRole('listitem')[0]).toHaveTextContent('Packet 2')
  })

  it('says plainly that somebody without an e-mail gets no mail', () => {
    const address = { street: '1 Mill Road', town: 'Tansy', region: 'KS', postalCode: '67000' }
    const producer = { id: 'p', personId: null, name: 'Ed', farmName: 'Ed', address }
    expect(addressText(producer)).toContain('nothing is mailed. By post: 1 Mill Road')
    expect(addressText(undefined)).toContain('nothing is sent')
  })
})
