import {
  computeDesign,
  costListInputSchema,
  designInput,
  designPlanSchema,
  jobInputSchema,
  producerInputSchema,
  publishedCriteria,
  quantityKeys,
  scheduleInputSchema,
  settingsCatalogue,
  settingsInputSchema,
  sourceFromSchedule,
  surveyInputSchema,
  type DesignPlan,
} from 'shared'
import { scheduleProblems } from '../../schedules/schedule-problems.js'
import { reduceSurvey } from '../../surveys/reduce-survey.js'
import type { DemoDistrict, DemoJob } from '../demo-district.js'
import { demoStates } from '../paths.js'
import { demoDistricts } from './demo-districts.js'

const year = 2026

function workedOut({ rules }: DemoDistrict, { survey }: DemoJob, plan: DesignPlan) {
  const schedules = rules.schedules(year)
  const sources = (plan.funding?.sources ?? []).map((choice) => {
    const schedule = schedules.find(({ key }) => key === choice.scheduleKey)
    if (schedule === undefined) throw new Error(`No schedule ${choice.scheduleKey}.`)
    return sourceFromSchedule({ schedule, choice })
  })
  const groundLine = survey === undefined ? [] : reduceSurvey(survey).groundLine
  return computeDesign(
    designInput({
      plan,
      groundLine,
      costList: rules.costList(year),
      sources,
      criteria: publishedCriteria,
      settings: rules.settings,
    }),
  )
}

const failing = (result: ReturnType<typeof workedOut>): string[] =>
  result.checks.filter(({ verdict }) => verdict === 'fail').map(({ id }) => id)

const unready = (result: ReturnType<typeof workedOut>): string[] =>
  Object.entries(result).flatMap(([name, part]) => (part?.ok === false ? [name] : []))

describe('the example districts', () => {
  it('are two, both marked as examples, with nobody in common', () => {
    expect(demoDistricts).toHaveLength(2)
    for (const { name } of demoDistricts) expect(name).toMatch(/\(example\)$/)
    const emails = demoDistricts.flatMap(({ people, jobs }) => [
      ...people.map(({ email }) => email),
      ...jobs.flatMap(({ producer }) => producer.email ?? []),
    ])
    expect(new Set(emails).size).toBe(emails.length)
    for (const email of emails) expect(email).toMatch(/\.example$/)
  })

  it('show every state a job can reach today, and running water', () => {
    const jobs = demoDistricts[0]?.jobs ?? []
    expect(new Set(jobs.map(({ state }) => state))).toEqual(new Set(demoStates))
    expect(jobs.some(({ job }) => job.body === 'stream')).toBe(true)
  })
})

describe.each(demoDistricts)('$name', (district) => {
  const { people, rules, jobs } = district

  it('has two planners, of whom the second checks, and one person for each other role', () => {
    const roles = people.map(({ role }) => role)
    expect(roles).toEqual(['planner', 'planner', 'supervisor', 'office', 'administrator'])
  })

  it('leaves no needed setting empty, and prices every quantity that its schedules pay', () => {
    const entered = settingsInputSchema.parse({ settings: rules.settings }).settings.map(({ key }) => key)
    const needed = settingsCatalogue.filter(({ isNeeded }) => isNeeded).map(({ key }) => key)
    expect(entered).toEqual(expect.arrayContaining(needed))
    const priced = costListInputSchema.parse(rules.costList(year)).lines.map(({ key }) => key)
    for (const schedule of rules.schedules(year)) {
      expect(scheduleProblems(scheduleInputSchema.parse(schedule))).toEqual([])
      for (const { quantityKey } of schedule.lines) expect(priced).toContain(quantityKey)
    }
    for (const key of priced) expect(quantityKeys).toContain(key)
  })

  it('has jobs with titles of their own, in the form the routes would take them', () => {
    expect(new Set(jobs.map(({ job }) => job.title)).size).toBe(jobs.length)
    for (const { job, producer, survey, designs } of jobs) {
      jobInputSchema.omit({ producerIds: true }).parse(job)
      producerInputSchema.parse(producer)
      if (survey !== undefined) surveyInputSchema.parse(survey)
      for (const { plan } of designs) designPlanSchema.parse(plan)
    }
  })

  it('works every design out whole', () => {
    for (const job of jobs) {
      for (const { plan } of job.designs) expect(unready(workedOut(district, job, plan))).toEqual([])
    }
  })

  it('sends no design out that fails a check; only one draft does, for its grade', () => {
    for (const job of jobs) {
      for (const { plan } of job.designs) {
        const isSteep = job.job.title === 'Lindquist, steep bank'
        expect(failing(workedOut(district, job, plan))).toEqual(isSteep ? ['grade'] : [])
      }
    }
  })
})
