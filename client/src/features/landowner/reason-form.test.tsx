import { QueryClient, QueryClientProvider } from '@tanstack/react-query'
import { render, screen } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { afterEach, describe, expect, it, vi } from 'vitest'
import '../../i18n/i18n'
import { ReasonForm } from './reason-form'

function show() {
  const fetched = vi.fn().mockResolvedValue(Response.json({ id: 'j1' }))
  vi.stubGlobal('fetch', fetched)
  const onDone = vi.fn()
  render(
    <QueryClientProvider client={new QueryClient()}>
      <ReasonForm jobId="j1" words="withdraw" onDone={onDone} />
    </QueryClientProvider>,
  )
  return { fetched, onDone }
}

const press = (name: string) => userEvent.click(screen.getByRole('button', { name }))

afterEach(() => vi.unstubAllGlobals())

describe('withdrawing', () => {
  it('asks for a reason before it asks whether one is sure', async () => {
    show()
    await press('Withdraw')
    expect(screen.getByText('This must not be empty')).toBeVisible()
    expect(screen.queryByText('Withdraw for good?')).toBeNull()
  })

  it('sends nothing at the first press, and keeps the reason on the way back', async () => {
    const { fetched } = show()
    await userEvent.type(screen.getByLabelText('Why?'), 'The pond is sold.')
    await press('Withdraw')
    expect(screen.getByRole('alert')).toHaveTextContent('The pond is sold.')
    expect(fetched).not.toHaveBeenCalled()
    await press('No, go back')
    expect(screen.getByLabelText('Why?')).toHaveValue('The pond is sold.')
  })

  it('withdraws with the reason at the second press', async () => {
    const { fetched, onDone } = show()
    await userEvent.type(screen.getByLabelText('Why?'), 'The pond is sold.')
    await press('Withdraw')
    await press('Yes, I withdraw')
    expect(JSON.parse(fetched.mock.calls[0]?.[1].body)).toEqual({
      action: 'withdraw',
      reason: 'The pond is sold.',
    })
    expect(onDone).toHaveBeenCalledOnce()
  })
})
