import { QueryClient, QueryClientProvider } from '@tanstack/react-query'
import { render, screen, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { createMemoryRouter, RouterProvider } from 'react-router-dom'
import { afterEach, describe, expect, it, vi } from 'vitest'
import type { ScheduleLine, ScheduleView } from 'shared'
import { MappingForm } from './mapping-form'

const line = (code: string, title: string, quantityKey: string | null): ScheduleLine => ({
  code,
  title,
  quantityKey,
  practice: '561',
  unit: 'ton',
  baseRate: '21.50',
})

const schedule = (change: Partial<ScheduleView> = {}): ScheduleView => ({
  id: 's1',
  key: 'basin-fund',
  name: 'Basin fund',
  fiscalYear: 2026,
  kind: 'unit-rate',
  effectiveFrom: '2025-10-01',
  effectiveTo: '2026-09-30',
  status: 'draft',
  version: 4,
  lines: [line('B-1', 'Surface stone', 'stone-surface'), line('B-2', 'Base stone', null)],
  ...change,
})

function show(shown: ScheduleView, ...answers: Response[]) {
  const fetched = vi.fn()
  for (const answer of answers) fetched.mockResolvedValueOnce(answer)
  vi.stubGlobal('fetch', fetched)
  const router = createMemoryRouter([{ path: '/', element: <MappingForm schedule={shown} /> }])
  render(
    <QueryClientProvider client={new QueryClient()}>
      <RouterProvider router={router} />
    </QueryClientProvider>,
  )
  return fetched
}

const choose = (label: string, key: string) => userEvent.selectOptions(screen.getByLabelText(label), key)
const press = (name: string) => userEvent.click(screen.getByRole('button', { name }))

afterEach(() => vi.unstubAllGlobals())

describe('mapping a schedule', () => {
  it('counts the lines that pay for nothing and shows them first', () => {
    show(schedule())
    expect(screen.getByText('1 of 2 pay for nothing yet')).toBeVisible()
    const codes = screen.getAllByRole('rowheader').map((header) => header.textContent)
    expect(codes).toEqual(['B-2', 'B-1'])
  })

  it('names each line that pays for nothing before the schedule is put in force, and that it is for good', async () => {
    const fetched = show(schedule(), Response.json(schedule({ status: 'in-force' })))
    await press('Put in force')
    const dialog = screen.getByRole('dialog')
    expect(dialog).toHaveTextContent(/it can never be edited/)
    expect(within(dialog).getByRole('listitem')).toHaveTextContent('B-2, Base stone')
    expect(fetched).not.toHaveBeenCalled()
    await press('Put in force for good')
    expect(fetched.mock.calls[0]?.[0]).toBe('/api/schedules/s1/put-in-force')
  })

  it('keeps a rate for each unit out of force while no line is mapped', () => {
    show(schedule({ lines: [line('B-2', 'Base stone', null)] }))
    expect(screen.getByRole('button', { name: 'Put in force' })).toHaveAccessibleDescription(
      /Map at least one line/,
    )
  })

  it('wants a changed mapping saved first, and saves it with the version that was seen', async () => {
    const saved = schedule({
      version: 5,
      lines: [line('B-1', 'Surface stone', 'stone-surface'), line('B-2', 'Base stone', 'stone-base')],
    })
    const fetched = show(schedule(), Response.json(saved))
    await choose('B-2 pays for', 'stone-base')
    expect(screen.getByRole('button', { name: 'Put in force' })).toHaveAccessibleDescription(
      'Save the mapping first.',
    )
    await press('Save the mapping')
    const [, options] = fetched.mock.calls[0] ?? []
    expect(options.headers.get('If-Match')).toBe('"v4"')
    expect(JSON.parse(options.body).mapping).toContainEqual({ code: 'B-2', quantityKey: 'stone-base' })
    expect(await screen.findByText('The mapping is saved.')).toBeVisible()
  })

  it('keeps what was chosen when somebody else saved in between', async () => {
    const theirs = schedule({ version: 7 })
    const stale = Response.json(
      { type: 'urn:wadestone:problem:stale-version', title: 'Newer', status: 412, current: theirs },
      { status: 412 },
    )
    show(schedule(), stale)
    await choose('B-2 pays for', 'stone-base')
    await press('Save the mapping')
    expect(await screen.findByText('Somebody saved in between')).toBeVisible()
    expect(screen.getByLabelText('B-2 pays for')).toHaveValue('stone-base')
  })
})
