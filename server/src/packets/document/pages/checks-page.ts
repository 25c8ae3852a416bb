import { formatInstant, trimmedNumber, type CheckResult } from 'shared'
import type { Block, PageDraft, TableRow } from '../layout/block.js'
import type { PacketSource } from '../packet-source.js'

/** A sign beside the word, so that no verdict speaks by its colour or its word alone. */
const verdictWords = {
  pass: '✓ holds',
  caution: '△ caution',
  fail: '■ fails',
  'not-applicable': '○ not judged',
} as const
const order = ['fail', 'caution', 'pass', 'not-applicable'] as const

/** Each rule with its limit, what the design has, the verdict and where the rule comes from. */
export function checksPage(source: PacketSource): PageDraft {
  const { checks } = source.result
  const rows = order.flatMap((verdict) => checks.filter((check) => check.verdict === verdict).map(checkRow))
  const count = (verdict: CheckResult['verdict']) =>
    checks.filter((check) => check.verdict === verdict).length
  const summary = `${count('pass')} hold, ${count('caution')} cautions, ${count('fail')} fail, ${count('not-applicable')} not judged for want of a limit or a figure.`
  const set = source.criteriaSet
    ? ` Criteria: ${source.criteriaSet.name}, in force from ${source.criteriaSet.effectiveFrom}.`
    : ''
  return {
    title: 'Checks and their sources',
    blocks: [
      { kind: 'paragraph', text: `${summary}${set}` },
      {
        kind: 'table',
        columns: [
          { title: 'Rule', share: 26 },
          { title: 'Design', share: 11, align: 'right' },
          { title: 'Limit', share: 14, align: 'right' },
          { title: 'Verdict', share: 13 },
          { title: 'Source and note', share: 40 },
        ],
        rows,
      },
      ...varianceBlocks(source),
    ],
  }
}

function checkRow(check: CheckResult): TableRow {
  const { title, unit, verdict, source, note } = check
  return {
    cells: [
      title,
      withUnit(actualText(check.actual), unit),
      limitText(check),
      verdictWords[verdict],
      [source, note].filter(Boolean).join('; '),
    ],
  }
}

function actualText(actual: CheckResult['actual']): string {
  if (actual === null) return '–'
  return typeof actual === 'boolean' ? (actual ? 'yes' : 'no') : trimmedNumber(actual, 3)
}

const withUnit = (text: string, unit: string) => (unit && text !== '–' ? `${text}\u00a0${unit}` : text)

const signs = { 'at-least': '≥\u00a0', 'at-most': '≤\u00a0', between: '', yes: '' } as const

function limitText({ comparison, limit, unit }: CheckResult): string {
  if (comparison === 'yes') return 'yes'
  if (limit === null) return 'not set'
  const text =
    typeof limit === 'number'
      ? trimmedNumber(limit, 3)
      : limit.map((end) => trimmedNumber(end, 3)).join(' to ')
  return withUnit(`${signs[comparison]}${text}`, unit)
}

function varianceBlocks({ variances, result, district }: PacketSource): Block[] {
  const missed = result.checks.filter(({ verdict }) => verdict === 'fail')
  if (variances.length === 0 && missed.length === 0) return []
  const titleOf = (id: string) => result.checks.find((check) => check.id === id)?.title ?? id
  return [
    { kind: 'heading', text: 'Variances' },
    ...(variances.length === 0
      ? [{ kind: 'paragraph' as const, text: 'Nobody has taken the failing checks upon himself yet.' }]
      : [
          {
            kind: 'list' as const,
            items: variances.map(
              ({ checkId, reason, by, at }) =>
                `${titleOf(checkId)}: ${reason} (${by}, ${formatInstant(at, district.timeZone)})`,
            ),
          },
        ]),
  ]
}
