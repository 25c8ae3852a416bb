import { QueryClient, QueryClientProvider } from '@tanstack/react-query'
import { render, screen } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { createMemoryRouter, RouterProvider } from 'react-router-dom'
import { afterEach, describe, expect, it, vi } from 'vitest'
import type { SurveyView } from 'shared'
import { SurveyForm } from './survey-form'

const saved: SurveyView = {
  version: 3,
  survey: {
    kind: 'level-notes',
    startElevationFt: 104.2,
    rows: [
      { label: 'BM-1', backsightFt: 4.86 },
      { label: '0+00', stationFt: 0, intermediateFt: 5.86 },
      { label: '0+20', stationFt: 20, intermediateFt: 6.46 },
    ],
  },
  groundLine: [],
  reduction: null,
}

const show = (survey: SurveyView | null = saved) => {
  const page = <SurveyForm jobId="j-1" loaded={survey} lock={null} />
  render(
    <QueryClientProvider client={new QueryClient()}>
      <RouterProvider router={createMemoryRouter([{ path: '/', element: page }])} />
    </QueryClientProvider>,
  )
  return userEvent.setup({ pointerEventsCheck: 0, delay: null })
}

const cell = (row: number, column: string) => screen.getByLabelText(`Row ${row}, ${column}`)

const answer = (status: number, body: unknown) =>
  vi
    .spyOn(globalThis, 'fetch')
    .mockImplementation(() => Promise.resolve(new Response(JSON.stringify(body), { status })))

// A whole form of many boxes is slow to draw where other suites run beside it.
vi.setConfig({ testTimeout: 30_000 })
afterEach(() => vi.restoreAllMocks())

describe('the level-note grid', () => {
  it('moves down a column with Enter and the arrows and does not send the form', async () => {
    const sent = answer(200, saved)
    const user = show()
    await user.click(cell(1, 'backsight'))
    await user.keyboard('{Enter}')
    expect(cell(2, 'backsight')).toHaveFocus()
    await user.keyboard('{ArrowDown}')
    expect(cell(3, 'backsight')).toHaveFocus()
    await user.keyboard('{Shift>}{Enter}{/Shift}')
    expect(cell(2, 'backsight')).toHaveFocus()
    await user.keyboard('{ArrowRight}')
    expect(cell(2, 'intermediate')).toHaveFocus()
    expect(sent).not.toHaveBeenCalled()
  })

  it('lays a block copied from a spreadsheet over cells and adds the rows it needs', async () => {
    const user = show()
    await user.click(cell(3, 'point'))
    await user.paste('0+20\t0+20\t\t6.46\t\r\nTP-1\t0+49\t3.52\t\t9.46\r\n0+60\t0+60\t\t4.82\t\r\n')
    expect(cell(4, 'point')).toHaveValue('TP-1')
    expect(cell(4, 'backsight')).toHaveValue('3.52')
    expect(cell(4, 'foresight')).toHaveValue('9.46')
    expect(cell(5, 'station')).toHaveValue('0+60')
    // 104.20 + 4.86 - 9.46 = 99.60 at the turning point, + 3.52 - 4.82 = 98.30: reckoned by hand.
    expect(screen.getByRole('row', { name: /^4 .*99\.60/ })).toBeInTheDocument()
    expect(screen.getByRole('row', { name: /^5 .*98\.30/ })).toBeInTheDocument()
  })

  it('takes one paste back with one undo', async () => {
    const user = show()
    await user.click(cell(2, 'point'))
    await user.paste('a\t1\nb\t2')
    expect(cell(2, 'point')).toHaveValue('a')
    await user.click(screen.getByRole('button', { name: 'Undo the last change' }))
    expect(cell(2, 'point')).toHaveValue('0+00')
    expect(cell(3, 'point')).toHaveValue('0+20')
  })

  it('inserts a row above and takes a row out', async () => {
    const user = show()
    await user.click(screen.getByRole('button', { name: 'Insert a row above row 2' }))
    expect(cell(2, 'point')).toHaveValue('')
    expect(cell(3, 'point')).toHaveValue('0+00')
    await user.click(screen.getByRole('button', { name: 'Take out row 2' }))
    expect(cell(2, 'point')).toHaveValue('0+00')
  })

  it('keeps a figure that is no number as typed and says what would be right', async () => {
    const sent = answer(200, saved)
    const user = show()
    await user.clear(cell(2, 'intermediate'))
    await user.type(cell(2, 'intermediate'), '5,8x')
    await user.click(screen.getByRole('button', { name: 'Save the survey' }))
    expect(cell(2, 'intermediate')).toHaveValue('5,8x')
    expect(cell(2, 'intermediate')).toHaveAccessibleDescription(
      'Row 2, intermediate: Give a number from -30 to 60 ft',
    )
    expect(sent).not.toHaveBeenCalled()
  })

  it('shows what the formulas of the server refuse beside the row it names', async () => {
    answer(422, {
      type: 'urn:wadestone:problem:invalid-fields',
      title: 'Some fields need another look',
      status: 422,
      fields: [{ pointer: '/rows/1', message: 'Row 2: a sight stands in the wrong column.' }],
    })
    const user = show()
    await user.click(screen.getByRole('button', { name: 'Save the survey' }))
    expect(
      await screen.findByRole('cell', { name: 'Row 2: a sight stands in the wrong column.' }),
    ).toBeVisible()
  })

  it('shows what somebody else saved and saves mine over it on their version', async () => {
    const theirs = {
      ...saved,
      version: 4,
      survey: { ...saved.survey, rows: [{ label: 'BM-1', backsightFt: 4.68 }] },
    }
    const sent = answer(412, {
      type: 'urn:wadestone:problem:stale-version',
      title: 'Someone saved a newer version',
      status: 412,
      detail: 'Somebody saved version 4 of the survey in between.',
      current: theirs,
    })
    const user = show()
    await user.click(screen.getByRole('button', { name: 'Save the survey' }))
    expect(await screen.findByText(/saved version 4/)).toBeInTheDocument()
    expect(screen.getByRole('rowheader', { name: 'Row 1, backsight' })).toBeInTheDocument()
    await user.click(screen.getByRole('button', { name: 'Save mine over it' }))
    const versions = sent.mock.calls.map(([, init]) => new Headers(init?.headers).get('If-Match'))
    expect(versions).toEqual(['"v3"', '"v4"'])
  })
})
