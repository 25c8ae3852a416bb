import { QueryClient, QueryClientProvider } from '@tanstack/react-query'
import { render, screen } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { createMemoryRouter, RouterProvider } from 'react-router-dom'
import { afterEach, describe, expect, it, vi } from 'vitest'
import { PasswordOnce } from './password-once'
import { PersonForm } from './person-form'

const person = {
  id: 'p',
  name: 'Ada Fen',
  email: 'ada@example.org',
  roles: [],
  approvalLimits: null,
  isActive: true,
}

function show() {
  const answer = { person, temporaryPassword: 'once-only' }
  const fetched = vi.fn().mockResolvedValue(Response.json(answer))
  vi.stubGlobal('fetch', fetched)
  const onAdded = vi.fn()
  render(
    <QueryClientProvider client={new QueryClient()}>
      <PersonForm onAdded={onAdded} />
    </QueryClientProvider>,
  )
  return { fetched, onAdded }
}

const add = () => userEvent.click(screen.getByRole('button', { name: 'Add this person' }))

async function typeNames() {
  await userEvent.type(screen.getByLabelText('Name'), 'Ada Fen')
  await userEvent.type(screen.getByLabelText('E-mail'), 'ada@example.org')
}

afterEach(() => vi.unstubAllGlobals())

describe('a new person', () => {
  it('has at least one role', async () => {
    const { fetched } = show()
    await typeNames()
    await add()
    expect(screen.getByRole('alert')).toHaveTextContent('Roles: Add at least one')
    expect(fetched).not.toHaveBeenCalled()
  })

  it('has no limits unless the tick opens them, and then all four', async () => {
    const { fetched } = show()
    await typeNames()
    await userEvent.click(screen.getByRole('checkbox', { name: /^planner/ }))
    await userEvent.click(screen.getByRole('checkbox', { name: 'Checks designs of others' }))
    await add()
    expect(screen.getByRole('alert')).toHaveTextContent('4 fields need another look')
    await userEvent.click(screen.getByRole('checkbox', { name: 'Checks designs of others' }))
    await add()
    expect(JSON.parse(fetched.mock.calls[0]?.[1].body)).toEqual({
      name: 'Ada Fen',
      email: 'ada@example.org',
      roles: ['planner'],
      approvalLimits: null,
    })
  })

  it('gets a password that is shown and can be copied', async () => {
    const added = { person, temporaryPassword: 'once-only' }
    const router = createMemoryRouter([{ path: '/', element: <PasswordOnce added={added} /> }])
    render(<RouterProvider router={router} />)
    const user = userEvent.setup()
    expect(screen.getByRole('status', { name: 'Password of Ada Fen' })).toHaveTextContent('once-only')
    await user.click(screen.getByRole('button', { name: 'Copy the password' }))
    expect(await navigator.clipboard.readText()).toBe('once-only')
    expect(await screen.findByText('Copied.')).toBeVisible()
  })
})
