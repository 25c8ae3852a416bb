import { QueryClient, QueryClientProvider } from '@tanstack/react-query'
import { render, screen, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { createMemoryRouter, RouterProvider } from 'react-router-dom'
import { afterEach, describe, expect, it, vi } from 'vitest'
import type { SettingsView, SettingView } from 'shared'
import { SettingsForm } from './settings-form'

const swell: SettingView = {
  key: 'swellPercent',
  label: 'Swell of excavated earth',
  unit: '%',
  minimum: 0,
  maximum: 100,
  isNeeded: true,
  hint: 'Loose volume over bank volume, less one.',
  value: 30,
  source: 'Board, item 4',
  sourceDate: '2026-02-10',
}
const shrink: SettingView = {
  ...swell,
  key: 'shrinkPercent',
  label: 'Shrink of compacted earth',
  maximum: 50,
  value: null,
  source: '',
  sourceDate: '',
}

const view = (version: number, ...settings: SettingView[]): SettingsView => ({ version, settings })
const seen = view(3, swell, shrink)

const stale = (current: SettingsView) =>
  Response.json(
    { type: 'urn:wadestone:problem:stale-version', title: 'Newer', status: 412, current },
    { status: 412 },
  )

function show(...answers: Response[]) {
  const fetched = vi.fn()
  for (const answer of answers) fetched.mockResolvedValueOnce(answer)
  vi.stubGlobal('fetch', fetched)
  const router = createMemoryRouter([{ path: '/', element: <SettingsForm view={seen} /> }])
  render(
    <QueryClientProvider client={new QueryClient()}>
      <RouterProvider router={router} />
    </QueryClientProvider>,
  )
  return fetched
}

const group = (name: string) => within(screen.getByRole('group', { name }))
const valueOf = (name: string) => group(name).getByLabelText(`${name}, %`)
const save = () => userEvent.click(screen.getByRole('button', { name: 'Save the settings' }))

async function typeSwell(value: string) {
  await userEvent.clear(valueOf(swell.label))
  await userEvent.type(valueOf(swell.label), value)
}

afterEach(() => vi.unstubAllGlobals())

describe('settings of the district', () => {
  it('shows what is needed and still empty first, counted, with range and reason', () => {
    show()
    const [first] = screen.getAllByRole('region')
    expect(first).toHaveAccessibleName('Needed and still empty')
    expect(first).toHaveTextContent(/Needed and still empty1/)
    expect(group(shrink.label).getByText(/From 0 to 50 %/)).toBeVisible()
  })

  it('saves only what was changed, with the version that was seen', async () => {
    const fetched = show(Response.json(view(4, { ...swell, value: 25 }, shrink)))
    await typeSwell('25')
    await save()
    const [, options] = fetched.mock.calls[0] ?? []
    expect(options.headers.get('If-Match')).toBe('"v3"')
    expect(JSON.parse(options.body)).toEqual({
      settings: [{ key: 'swellPercent', value: 25, source: 'Board, item 4', sourceDate: '2026-02-10' }],
    })
    expect(await screen.findByText('The settings are saved.')).toBeVisible()
  })

  it('wants a source and a date with a value, and the value within its range', async () => {
    const fetched = show()
    await userEvent.type(valueOf(shrink.label), '60')
    await save()
    const alert = screen.getByRole('alert')
    expect(alert).toHaveTextContent(/Shrink of compacted earth: Must be at most 50 %/)
    await userEvent.clear(valueOf(shrink.label))
    await userEvent.type(valueOf(shrink.label), '12')
    await save()
    expect(screen.getByRole('alert')).toHaveTextContent(/Source of shrink.*must not be empty/i)
    expect(fetched).not.toHaveBeenCalled()
  })

  it('keeps what was typed when the version is stale, and shows both figures', async () => {
    show(stale(view(9, { ...swell, value: 28 }, shrink)))
    await typeSwell('25')
    await save()
    const alert = await screen.findByRole('alert')
    expect(alert).toHaveTextContent(/25 %.*28 %/)
    expect(valueOf(swell.label)).toHaveValue('25')
  })

  it('saves mine over the newer version only when one says so', async () => {
    const newer = view(9, { ...swell, value: 28 }, shrink)
    const fetched = show(stale(newer), Response.json(view(10, { ...swell, value: 25 }, shrink)))
    await typeSwell('25')
    await save()
    await userEvent.click(await screen.findByRole('button', { name: 'Save mine over it' }))
    expect(fetched.mock.calls[1]?.[1].headers.get('If-Match')).toBe('"v9"')
    expect(await screen.findByText('The settings are saved.')).toBeVisible()
  })

  it('takes the newer figures when one says so', async () => {
    show(stale(view(9, { ...swell, value: 28 }, shrink)))
    await typeSwell('25')
    await save()
    await userEvent.click(await screen.findByRole('button', { name: 'Take theirs' }))
    expect(valueOf(swell.label)).toHaveValue('28')
    expect(screen.queryByText('Somebody saved in between')).toBeNull()
  })
})
