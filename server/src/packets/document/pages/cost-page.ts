import { formatQuantity, moneyText, numberText, readyValue, type FundedSource } from 'shared'
import type { Block, PageDraft, TableRow } from '../layout/block.js'
import type { PacketSource } from '../packet-source.js'

/** What it costs, which fund pays what and why not more, and what is left to the landowner. */
export function costPage(source: PacketSource): PageDraft {
  return { title: 'Cost and who pays', blocks: [...costBlocks(source), ...fundingBlocks(source)] }
}

function costBlocks({ result, costList }: PacketSource): Block[] {
  const cost = readyValue(result.cost)
  if (!cost) return []
  const rows = cost.lines.map((line): TableRow => ({
    cells: [
      line.description,
      formatQuantity(line.quantity, line.unit),
      `$${line.unitCost.typical}`,
      moneyText(line.typical),
    ],
  }))
  const range = `With the low unit costs of the list the total is ${moneyText(cost.low)}, with the high ones ${moneyText(cost.high)}.`
  const list = costList ? ` Unit costs: ${costList.name}, ${costList.source}.` : ''
  return [
    { kind: 'heading', text: 'Estimated cost' },
    {
      kind: 'table',
      columns: [
        { title: 'Item', share: 46 },
        { title: 'Quantity', share: 20, align: 'right' },
        { title: 'Cost a unit', share: 16, align: 'right' },
        { title: 'Cost', share: 18, align: 'right' },
      ],
      rows: [...rows, { kind: 'sum', cells: ['Total', '', '', moneyText(cost.typical)] }],
    },
    {
      kind: 'paragraph',
      text: `${range}${list} Each line is rounded to cents once; the total is the sum of the lines shown.`,
      size: 'small',
      tone: 'mute',
    },
  ]
}

function fundingBlocks({ result }: PacketSource): Block[] {
  const funding = readyValue(result.funding)
  const cost = readyValue(result.cost)
  if (!funding || !cost) return []
  const nameOf = (key: string) => cost.lines.find((line) => line.key === key)?.description ?? key
  return [
    { kind: 'heading', text: 'Who pays' },
    {
      kind: 'table',
      columns: [
        { title: 'Who', share: 66 },
        { title: 'Offered', share: 17, align: 'right' },
        { title: 'Pays', share: 17, align: 'right' },
      ],
      rows: [
        ...funding.sources.flatMap(sourceRows),
        { cells: ['All funds together', '', moneyText(funding.totalPaid)] },
        { kind: 'sum', cells: ['Landowner’s share', '', moneyText(funding.landownerShare)] },
      ],
    },
    ...funding.sources.flatMap((fund) => sourceLines(fund, nameOf)),
    {
      kind: 'paragraph',
      size: 'small',
      tone: 'mute',
      text: 'What a fund pays in the end rests on what is built, measured and certified: the least of the quantity scheduled, designed and built, at the rate of this packet.',
    },
  ]
}

function sourceRows(source: FundedSource): TableRow[] {
  const cuts = source.cuts.map((cut): TableRow => ({
    cells: [`   less: ${cut.reason}`, `−${moneyText(cut.amount)}`, ''],
  }))
  return [
    { cells: [source.name, moneyText(source.offered), moneyText(source.paid)] },
    { cells: [`   ${howItPays(source)}`, '', ''] },
    ...cuts,
  ]
}

const percentOfWords = {
  'estimated-cost': 'of the estimated cost',
  'cost-after-earlier-sources': 'of the cost left after the funds before it',
} as const

function howItPays({ kind, percentOf, base }: FundedSource): string {
  if (kind === 'unit-rate') return 'a rate for each unit'
  if (kind === 'fixed') return 'a fixed amount'
  const of = percentOfWords[percentOf ?? 'estimated-cost']
  return `a percent ${of}${base ? `, taken of ${moneyText(base)}` : ''}`
}

/** The lines of one fund, which sum to what it pays. */
function sourceLines(source: FundedSource, nameOf: (key: string) => string): Block[] {
  const rows = source.lines.map((line): TableRow => ({
    cells: [
      nameOf(line.key),
      numberText(line.quantityUsed, 4).replace(/\.?0+$/, ''),
      line.rate ? `$${line.rate}` : '',
      moneyText(line.amount),
    ],
  }))
  const hasAdvance = source.advance !== '0.00'
  const advance: Block[] = hasAdvance
    ? [
        {
          kind: 'paragraph',
          size: 'small',
          text: `Of this, ${moneyText(source.advance)} may be paid in advance.`,
        },
      ]
    : []
  return [
    { kind: 'heading', text: `${source.name}: ${moneyText(source.paid)}` },
    {
      kind: 'table',
      columns: [
        { title: 'Line', share: 46 },
        { title: 'Quantity', share: 20, align: 'right' },
        { title: 'Rate', share: 16, align: 'right' },
        { title: 'Pays', share: 18, align: 'right' },
      ],
      rows,
    },
    ...advance,
  ]
}
