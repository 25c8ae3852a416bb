import { QueryClient, QueryClientProvider } from '@tanstack/react-query'
import { render, screen } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { createMemoryRouter, RouterProvider } from 'react-router-dom'
import { afterEach, describe, expect, it, vi } from 'vitest'
import { NewScheduleForm } from './new-schedule-form'

const line = {
  code: 'B-1',
  practice: '561',
  title: 'Stone',
  unit: 'ton',
  baseRate: '21.50',
  quantityKey: null,
}
const message = 'Row 3, column "base_rate" is "abc". Give a rate in dollars.'
const answers: Record<string, unknown> = {
  '/api/schedules/read-csv': { lines: [line], errors: [{ row: 3, column: 'base_rate', message }] },
  '/api/schedules': { id: 's1' },
}

function show() {
  const fetched = vi.fn<(path: string, options: RequestInit) => Promise<Response>>()
  fetched.mockImplementation((path) => Promise.resolve(Response.json(answers[path])))
  vi.stubGlobal('fetch', fetched)
  const onMade = vi.fn()
  const router = createMemoryRouter([{ path: '/', element: <NewScheduleForm onMade={onMade} /> }])
  render(
    <QueryClientProvider client={new QueryClient()}>
      <RouterProvider router={router} />
    </QueryClientProvider>,
  )
  return { fetched, onMade }
}

const type = (label: RegExp, text: string) => userEvent.type(screen.getByLabelText(label), text)
const upload = () =>
  userEvent.upload(screen.getByLabelText('CSV file of lines'), new File(['x'], 'a.csv', { type: 'text/csv' }))

afterEach(() => vi.unstubAllGlobals())

describe('a new schedule from a CSV file', () => {
  it('takes the good lines, lists the others by row and column, and sends the draft', async () => {
    const { fetched, onMade } = show()
    await upload()
    expect(await screen.findByText(message)).toBeVisible()
    await type(/^Name of the fund/, 'Basin fund')
    await type(/^Short name/, 'basin-fund')
    await type(/^Fiscal year/, '2026')
    await type(/^First day/, '2025-10-01')
    await type(/^Last day/, '2026-09-30')
    await userEvent.click(screen.getByRole('button', { name: 'Make the draft' }))
    await vi.waitFor(() => expect(onMade).toHaveBeenCalledWith({ id: 's1' }))
    const sent = fetched.mock.calls.find(([path]) => path === '/api/schedules')?.[1].body
    expect(JSON.parse(String(sent))).toEqual({
      key: 'basin-fund',
      name: 'Basin fund',
      kind: 'unit-rate',
      fiscalYear: 2026,
      effectiveFrom: '2025-10-01',
      effectiveTo: '2026-09-30',
      lines: [line],
    })
  })

  it('lets a rate that was read be emptied, and says what is missing', async () => {
    show()
    await upload()
    await userEvent.click(await screen.findByRole('button', { name: 'Change B-1' }))
    await userEvent.clear(screen.getByLabelText(/^Rate/))
    expect(screen.getByLabelText(/^Rate/)).toHaveValue('')
    await userEvent.click(screen.getByRole('button', { name: 'Make the draft' }))
    expect(await screen.findByText('Rate: This must not be empty')).toBeVisible()
  })
})
