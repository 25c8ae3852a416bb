import { QueryClient, QueryClientProvider } from '@tanstack/react-query'
import { render, screen } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { designParts, type DesignPlan, type DesignResult, type DesignView } from 'shared'
import { createMemoryRouter, RouterProvider, useParams } from 'react-router-dom'
import { afterEach, describe, expect, it, vi } from 'vitest'
import { DesignForm } from './design-form'
import { partSpec } from './part-catalogue'
import type { PartSpec } from './part-spec'

const plan: DesignPlan = {
  inputVersion: 1,
  ramp: {
    widthFt: 14,
    gradeRunPerRise: 10,
    topAboveFullPoolFt: 2,
    toeBelowFullPoolFt: 2.5,
    drinkingDepthAtLowWaterFt: 1.25,
    apronLengthFt: 4,
  },
}

const keys = [...designParts, 'quantities', 'cost', 'funding']
const result = {
  ...Object.fromEntries(keys.map((key) => [key, { ok: false, waitingFor: ['profile'] }])),
  profile: { ok: false, field: 'site.fullPoolElevationFt', message: 'Enter the water levels first.' },
  checks: [],
  working: [],
  calculationVersion: 't',
} as unknown as DesignResult

const design: DesignView = {
  ...{ id: 'd-1', jobId: 'j-1', name: 'Flat', version: 3, isChosen: true, plan, result },
  resolvedWith: { criteriaSet: null, costList: null, schedules: [], missing: [] },
  updatedAt: '2026-05-14T20:04:00Z',
  designerName: 'Ines',
}

interface Sent {
  version: string | null
  body: { name: string; plan: DesignPlan }
}

/** Answers each save in turn; the working out of a plan always answers. */
function answers(...saves: { status: number; body: object | null }[]): Sent[] {
  const sent: Sent[] = []
  vi.spyOn(globalThis, 'fetch').mockImplementation((path, init) => {
    const reply = (status: number, body: unknown) =>
      Promise.resolve(new Response(JSON.stringify(body), { status }))
    if (String(path).endsWith('/calculate')) return reply(200, { result, resolvedWith: design.resolvedWith })
    if (init?.method !== 'PUT') return reply(200, [])
    const version = new Headers(init.headers).get('If-Match')
    const body = JSON.parse(String(init.body)) as Sent['body']
    sent.push({ version, body })
    const next = saves.shift() ?? { status: 500, body: null }
    return reply(next.status, next.status === 200 ? { ...next.body, ...body } : next.body)
  })
  return sent
}

const facts = { body: 'pond', waterSurfaceFt: 98.6 } as const

function PageOfPart() {
  const { part = '' } = useParams()
  return <DesignForm design={design} spec={partSpec(part) as PartSpec} facts={facts} lock={null} />
}

const show = (part: string) => {
  const routes = [{ path: '/jobs/:jobId/design/:designId/:part', element: <PageOfPart /> }]
  const router = createMemoryRouter(routes, { initialEntries: [`/jobs/j-1/design/d-1/${part}`] })
  render(
    <QueryClientProvider client={new QueryClient()}>
      <RouterProvider router={router} />
    </QueryClientProvider>,
  )
  return { router, user: userEvent.setup({ pointerEventsCheck: 0, delay: null }) }
}

const refusal = (pointer: string, message: string) => ({
  status: 422,
  body: {
    type: 'urn:wadestone:problem:invalid-fields',
    title: 'Some fields need another look',
    status: 422,
    fields: [{ pointer, message }],
  },
})

// A whole form of many boxes is slow to draw where other suites run beside it.
vi.setConfig({ testTimeout: 30_000 })
afterEach(() => vi.restoreAllMocks())

describe('the design form', () => {
  it('puts what the server says of a figure at the field of that figure', async () => {
    answers(refusal('/plan/ramp/widthFt', 'The ramp is too narrow for this herd.'))
    const { user } = show('ramp')
    await user.click(screen.getByText('Save the design'))
    const width = await screen.findByLabelText(/^Width/)
    expect(await screen.findByText('Width: The ramp is too narrow for this herd.')).toBeInTheDocument()
    expect(width).toHaveAccessibleDescription('The ramp is too narrow for this herd.')
  })

  it('leads to the part on which a refused figure stands', async () => {
    answers(refusal('/plan/ramp/widthFt', 'The ramp is too narrow for this herd.'))
    const { user, router } = show('site')
    await user.click(screen.getByText('Save the design'))
    expect(await screen.findByLabelText(/^Width/)).toHaveValue('14')
    expect(router.state.location.pathname).toBe('/jobs/j-1/design/d-1/ramp')
  })

  it('keeps what cannot be read as typed, says what would be right, and sends nothing', async () => {
    const sent = answers()
    const { user } = show('ramp')
    await user.clear(screen.getByLabelText(/^Width/))
    await user.type(screen.getByLabelText(/^Width/), '14,5x')
    await user.click(screen.getByText('Save the design'))
    expect(await screen.findByText('Width: Give a number from 4 to 120 ft')).toBeInTheDocument()
    expect(screen.getByLabelText(/^Width/)).toHaveValue('14,5x')
    expect(sent).toEqual([])
  })

  it('sends an emptied optional field no more, on the version that was seen', async () => {
    const sent = answers({ status: 200, body: { ...design, version: 4 } })
    const { user } = show('ramp')
    await user.clear(screen.getByLabelText(/^Apron/))
    await user.click(screen.getByText('Save the design'))
    expect(await screen.findByText('Saved as version 4.')).toBeInTheDocument()
    expect(sent[0]?.version).toBe('"v3"')
    expect(sent[0]?.body.plan.ramp).not.toHaveProperty('apronLengthFt')
  })

  it('starts a part with what the job knows and keeps what is half typed from part to part', async () => {
    answers()
    const { user } = show('site')
    await user.click(screen.getByText('Start this part'))
    expect(screen.getByLabelText(/^Kind of water/)).toHaveValue('pond')
    expect(screen.getByLabelText(/^Water while building/)).toHaveValue('98.6')
    await user.type(screen.getByLabelText(/^Full pool/), '100')
    await user.click(screen.getByText('Next: Ramp'))
    await user.click(screen.getByText('Back: Water levels'))
    expect(screen.getByLabelText(/^Full pool/)).toHaveValue('100')
  })

  it('adds a row, takes it out and puts it back as it was', async () => {
    answers()
    const { user } = show('rock')
    await user.click(screen.getByText('Start this part'))
    await user.type(screen.getAllByLabelText(/^Name/)[1] as HTMLElement, 'big')
    await user.click(screen.getByText('Take out', { selector: '[aria-label="Layer 2"] button' }))
    expect(screen.getAllByLabelText(/^Name/)).toHaveLength(1)
    await user.click(screen.getByText('Put the layer back'))
    expect(screen.getAllByLabelText(/^Name/)[1]).toHaveValue('big')
  })

  it('shows what somebody else saved, and saves my part over their version with their other parts', async () => {
    const earthwork = {
      ...{ edgeAllowanceFt: 0.5, cutSideRunPerRise: 3, fillSideRunPerRise: 3, stationIntervalFt: 10 },
    }
    const theirs = { ...design, version: 4, plan: { ...plan, earthwork } }
    const stale = {
      type: 'urn:wadestone:problem:stale-version',
      title: 'Someone saved a newer version',
      status: 412,
      current: theirs,
    }
    const sent = answers({ status: 412, body: stale }, { status: 200, body: { ...theirs, version: 5 } })
    const { user } = show('ramp')
    await user.clear(screen.getByLabelText(/^Width/))
    await user.type(screen.getByLabelText(/^Width/), '16')
    await user.click(screen.getByText('Save the design'))
    expect(await screen.findByText('Ramp, width')).toBeInTheDocument()
    await user.click(screen.getByText('Save mine over it'))
    expect(await screen.findByText('Saved as version 5.')).toBeInTheDocument()
    expect(sent[1]?.version).toBe('"v4"')
    expect(sent[1]?.body.plan).toEqual({ ...plan, earthwork, ramp: { ...plan.ramp, widthFt: 16 } })
  })

  it('says what is in the way of a result and where it is mended', async () => {
    answers()
    show('ramp')
    expect(await screen.findByText('Enter the water levels first.')).toBeInTheDocument()
    expect(screen.getByText('Open: Water levels')).toHaveAttribute('href', '/jobs/j-1/design/d-1/site')
  })
})
