import { formatCivilDate, forWords, type FieldProblem, type ScheduleInput } from 'shared'
import { scheduleLineProblems } from './schedule-line-problems.js'

type Kind = ScheduleInput['kind']
type Term = 'percent' | 'higherPercent' | 'percentOf' | 'amount'

/** What each kind of schedule must say, what it may say, and how it is called when it says something else. */
const termsOf: Readonly<
  Record<Kind, { pays: string; needs: readonly Term[]; may: readonly Term[]; needsLines: boolean }>
> = {
  'unit-rate': { pays: 'pays by the unit', needs: [], may: [], needsLines: true },
  'percent-of-cost': {
    pays: 'pays a percent of the cost',
    needs: ['percent', 'percentOf'],
    may: ['higherPercent'],
    needsLines: false,
  },
  fixed: { pays: 'pays a fixed amount', needs: ['amount'], may: [], needsLines: false },
}

const words: Readonly<Record<Term, { name: string; ask: string }>> = {
  percent: { name: 'percent', ask: 'Give the percent of the cost that it pays.' },
  higherPercent: { name: 'higher percent', ask: 'Give the higher percent.' },
  percentOf: {
    name: 'base of a percent',
    ask: 'Say of what the percent is taken: of the estimated cost, or of the cost after earlier sources.',
  },
  amount: { name: 'amount', ask: 'Give the amount in dollars and cents, such as 800.00.' },
}

/** What stands against a schedule, beside the field it stands in. The schema has looked at each field by itself. */
export function scheduleProblems(schedule: ScheduleInput): FieldProblem[] {
  return [
    ...termProblems(schedule),
    ...percentProblems(schedule),
    ...dateProblems(schedule),
    ...scheduleLineProblems(schedule.lines),
  ]
}

function termProblems(schedule: ScheduleInput): FieldProblem[] {
  const { pays, needs, may, needsLines } = termsOf[schedule.kind]
  const terms = Object.keys(words) as Term[]
  const problems = terms.flatMap((term) => {
    const pointer = `/${term}`
    const { name, ask } = words[term]
    const isGiven = schedule[term] !== undefined
    if (needs.includes(term) && !isGiven)
      return [{ pointer, message: `A schedule that ${pays} needs this. ${ask}` }]
    if (isGiven && !needs.includes(term) && !may.includes(term)) {
      return [{ pointer, message: `A schedule that ${pays} has no ${name}. Leave it empty.` }]
    }
    return []
  })
  if (!needsLines || schedule.lines.length > 0) return problems
  return [...problems, { pointer: '/lines', message: `A schedule that ${pays} needs at least one line.` }]
}

function percentProblems({ percent, higherPercent }: ScheduleInput): FieldProblem[] {
  if (percent === undefined || higherPercent === undefined || higherPercent >= percent) return []
  const message = `The higher percent, ${forWords(higherPercent)}, is below the percent, ${forWords(percent)}.`
  return [{ pointer: '/higherPercent', message }]
}

function dateProblems({ effectiveFrom, effectiveTo }: ScheduleInput): FieldProblem[] {
  if (effectiveTo >= effectiveFrom) return []
  const message = `It ends on ${formatCivilDate(effectiveTo)}, before it begins on ${formatCivilDate(effectiveFrom)}. Give that day or a later one.`
  return [{ pointer: '/effectiveTo', message }]
}
