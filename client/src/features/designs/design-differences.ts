import type { DesignPlan } from 'shared'
import type { Difference } from '../../components/feedback/stale-choice'
import { partCatalogue } from './part-catalogue'
import type { OwnSpec, PartItem } from './part-spec'

type Lines = Map<string, string>

const ownLabels: Record<OwnSpec['kind'], string> = {
  'fence-path': 'way',
  'roll-lengths': 'length of a roll',
  schedule: 'fund',
  contracted: 'under contract',
}

const words = (value: unknown): string =>
  typeof value === 'object' && value !== null
    ? JSON.stringify(value)
        .replace(/["{}[\]]/g, '')
        .replaceAll(',', ', ')
    : String(value ?? 'empty')

/** Every figure of a part by the name the page gives it. */
function collect(items: readonly PartItem[], value: unknown, prefix: string, lines: Lines): void {
  const held = (value ?? {}) as Readonly<Record<string, unknown>>
  for (const item of items) {
    const inner = held[item.name]
    if (inner === undefined) continue
    if (item.kind === 'field') lines.set(`${prefix}, ${item.label.toLowerCase()}`, words(inner))
    else if (item.kind === 'group') collect(item.items, inner, prefix, lines)
    else if (item.kind === 'list') {
      for (const [index, row] of (inner as unknown[]).entries()) {
        collect(item.items, row, `${prefix}, ${item.one} ${index + 1}`, lines)
      }
    } else lines.set(`${prefix}, ${ownLabels[item.kind]}`, words(inner))
  }
}

function linesOf(plan: DesignPlan): Lines {
  const lines: Lines = new Map()
  for (const { part, title, items } of partCatalogue) collect(items, plan[part], title, lines)
  return lines
}

/** Field by field what differs between two plans, in the words of the page. */
export function designDifferences(mine: DesignPlan, theirs: DesignPlan): Difference[] {
  const myLines = linesOf(mine)
  const theirLines = linesOf(theirs)
  return [...new Set([...myLines.keys(), ...theirLines.keys()])]
    .map((label) => ({
      label,
      mine: myLines.get(label) ?? 'empty',
      theirs: theirLines.get(label) ?? 'empty',
    }))
    .filter((difference) => difference.mine !== difference.theirs)
}
