import type { DesignView, JobView, PacketView } from 'shared'
import { describe, expect, it } from 'vitest'
import { jobOverviewSteps } from './job-overview-steps'

const job = (more: Partial<JobView>) =>
  ({ hasSurvey: false, chosenDesignId: null, openNotes: 0, ...more }) as JobView

const design = (verdicts: string[]) =>
  ({
    name: 'Flat',
    result: {
      quantities: { ok: true },
      funding: { ok: true },
      checks: verdicts.map((verdict) => ({ verdict })),
    },
  }) as unknown as DesignView

const packet = (more: Partial<PacketView>) => ({ revision: 2, technicalCheck: null, ...more }) as PacketView

const marks = (facts: Parameters<typeof jobOverviewSteps>[0]) =>
  Object.fromEntries(jobOverviewSteps(facts).map(({ title, mark }) => [title, mark]))

describe('the steps of the overview', () => {
  it('all wait in a new job, save the notes, of which none is open', () => {
    const { Notes, ...others } = marks({ job: job({}), design: null, packet: null })
    expect(Notes).toBe('pass')
    expect(new Set(Object.values(others))).toEqual(new Set(['waiting']))
  })

  it('do not call the checks done while one fails, and say how many do', () => {
    const facts = {
      job: job({ chosenDesignId: 'd' }),
      design: design(['pass', 'fail', 'caution', 'fail']),
      packet: null,
    }
    expect(marks(facts)).toMatchObject({ Figures: 'pass', Checks: 'fail' })
    expect(jobOverviewSteps(facts).find(({ title }) => title === 'Checks')?.sentence).toBe('2 checks fail.')
  })

  it('count a packet only when it is made, and the technical check apart from it', () => {
    const steps = (more: Partial<PacketView>) => marks({ job: job({}), design: null, packet: packet(more) })
    expect(steps({ status: 'making' })).toMatchObject({ Packet: 'waiting', 'Technical check': 'waiting' })
    expect(steps({ status: 'failed' })).toMatchObject({ Packet: 'fail' })
    const technicalCheck = { by: 'Ada', at: '2026-05-14T20:04:00Z', note: null, withinLimits: true }
    expect(steps({ status: 'ready', technicalCheck })).toMatchObject({
      Packet: 'pass',
      'Technical check': 'pass',
    })
  })

  it('show open notes as something to look at', () => {
    expect(marks({ job: job({ openNotes: 1 }), design: null, packet: null }).Notes).toBe('fail')
  })
})
