import type { FieldProblem, ScheduleLine } from 'shared'
import { mappingTroubles } from './mapping-troubles.js'

type Mapping = Pick<ScheduleLine, 'code' | 'quantityKey'>
type MappedLine = Mapping & Pick<ScheduleLine, 'unit'>

/** What stands against mapping some lines of a schedule anew while the others stay mapped as they are. */
export function remappingProblems(lines: readonly MappedLine[], mapping: readonly Mapping[]): FieldProblem[] {
  const byCode = new Map(lines.map((line) => [line.code, line]))
  const asked = new Set(mapping.map(({ code }) => code))
  // Those that stay come first, so that whatever stands against a pair is said of the line just mapped.
  const staying = lines.filter(({ code }) => !asked.has(code))
  const mapped = mapping.map(({ code, quantityKey }) => ({
    ...{ code, quantityKey },
    unit: byCode.get(code)?.unit ?? '',
  }))
  const troubles = mappingTroubles([...staying, ...mapped]).slice(staying.length)
  return mapping.flatMap(({ code }, index) => {
    const codeMessage = codeTrouble(code, mapping.findIndex((other) => other.code === code) === index, byCode)
    if (codeMessage !== null) return [{ pointer: `/mapping/${index}/code`, message: codeMessage }]
    const trouble = troubles[index] ?? null
    return trouble === null ? [] : [{ pointer: `/mapping/${index}/quantityKey`, message: trouble }]
  })
}

function codeTrouble(code: string, isFirst: boolean, byCode: ReadonlyMap<string, unknown>): string | null {
  if (!byCode.has(code)) return `This schedule has no line ${code}.`
  return isFirst ? null : `Line ${code} is mapped twice. Map it once.`
}
