import { QueryClient, QueryClientProvider } from '@tanstack/react-query'
import { render, screen } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import type { NoteView, Role, SessionView } from 'shared'
import { afterEach, describe, expect, it, vi } from 'vitest'
import { SessionContext } from '../../api/session-context'
import { NoteItem } from './note-item'

const note: NoteView = {
  id: 'n1',
  jobId: 'j1',
  page: 4,
  revision: 2,
  text: 'Is the wire in the water live?',
  author: 'June Pickard',
  authorId: 'p1',
  at: '2026-05-18T14:00:00Z',
  status: 'open',
  answers: [],
}

const sessionOf = (role: Role) =>
  ({
    personId: 'me',
    roles: [role],
    district: { id: 'd', name: 'Tansy Fork', timeZone: 'America/Chicago', isDemo: true },
  }) as SessionView

const show = (shown: NoteView, role: Role) =>
  render(
    <QueryClientProvider client={new QueryClient()}>
      <SessionContext value={sessionOf(role)}>
        <ul>
          <NoteItem jobId="j1" note={shown} />
        </ul>
      </SessionContext>
    </QueryClientProvider>,
  )

afterEach(() => vi.unstubAllGlobals())

describe('a note', () => {
  it('says by word whether it is open and which page of which revision it speaks of', () => {
    show(note, 'planner')
    expect(screen.getByText('open')).toBeInTheDocument()
    expect(screen.getByText(/page 4, revision 2/)).toBeInTheDocument()
  })

  it('can be answered by a planner, settled by a supervisor, and neither by the office', () => {
    const { unmount } = show(note, 'supervisor')
    expect(screen.queryByRole('button', { name: 'Answer' })).not.toBeInTheDocument()
    expect(screen.getByRole('button', { name: 'Settle the note of June Pickard' })).toBeInTheDocument()
    unmount()
    show(note, 'office')
    expect(screen.queryByRole('button')).not.toBeInTheDocument()
  })

  it('gives the answer box of each note a label of its own', async () => {
    render(
      <QueryClientProvider client={new QueryClient()}>
        <SessionContext value={sessionOf('planner')}>
          <ul>
            <NoteItem jobId="j1" note={note} />
            <NoteItem jobId="j1" note={{ ...note, id: 'n2' }} />
          </ul>
        </SessionContext>
      </QueryClientProvider>,
    )
    const ids = screen.getAllByLabelText('Answer').map(({ id }) => id)
    expect(new Set(ids).size).toBe(2)
  })

  it('keeps an answer that the server refused in its box, with the sentence of the refusal', async () => {
    const refusal = {
      type: 'urn:wadestone:problem:transition-not-allowed',
      title: 'The job cannot do this now',
      status: 409,
      reasons: ['This note is settled. Write a new one.'],
    }
    const fetched = vi.fn().mockResolvedValue(new Response(JSON.stringify(refusal), { status: 409 }))
    vi.stubGlobal('fetch', fetched)
    show(note, 'planner')
    await userEvent.type(screen.getByLabelText('Answer'), 'It never is.')
    await userEvent.click(screen.getByRole('button', { name: 'Answer' }))
    expect(await screen.findByRole('alert')).toHaveTextContent('This note is settled.')
    expect(screen.getByLabelText('Answer')).toHaveValue('It never is.')
    expect(JSON.parse(fetched.mock.calls[0]?.[1].body)).toEqual({ text: 'It never is.' })
  })
})
