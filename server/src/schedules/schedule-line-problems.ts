import type { FieldProblem, ScheduleLine } from 'shared'
import { mappingTroubles } from './mapping-troubles.js'

/** What stands against the lines of a schedule, beside the field it stands in. */
export function scheduleLineProblems(lines: readonly ScheduleLine[]): FieldProblem[] {
  const firstWith = new Map<string, number>()
  lines.forEach(({ code }, index) => firstWith.set(code, firstWith.get(code) ?? index))
  const troubles = mappingTroubles(lines)
  return lines.flatMap((line, index) => {
    const first = firstWith.get(line.code) ?? index
    const messages = {
      code: first === index ? null : `Lines ${first + 1} and ${index + 1} both have the code ${line.code}.`,
      higherRate: lowerHigherRate(line),
      quantityKey: troubles[index] ?? null,
    }
    return Object.entries(messages).flatMap(([field, message]) =>
      message === null ? [] : [{ pointer: `/lines/${index}/${field}`, message }],
    )
  })
}

/** A rate has fourteen digits at most, and a double keeps the order of those. */
function lowerHigherRate({ code, baseRate, higherRate }: ScheduleLine): string | null {
  if (higherRate === undefined || Number(higherRate) >= Number(baseRate)) return null
  return `The higher rate of line ${code}, ${higherRate}, is below its base rate, ${baseRate}.`
}
