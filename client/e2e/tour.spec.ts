import { createHash } from 'node:crypto'
import { expect, test } from '@playwright/test'
import { formatQuantity, moneyText, trimmedNumber, type Money } from 'shared'
import { changedExample, qpdfCheck, stoppedTour, tour, type TourRun } from './support/tour.js'

test.describe.configure({ mode: 'serial' })
test.setTimeout(180_000)

type Figure = TourRun['result']['figures'][string]

/** On which pages a figure belongs, and how it is printed there: by the first word of its name. */
const places: Record<string, { title: string; print: (figure: Figure) => string }> = {
  quantities: { title: 'Quantities', print: ({ value, unit }) => formatQuantity(Number(value), unit) },
  cost: { title: 'Cost and who pays', print: ({ value }) => moneyText(value as Money) },
  funding: { title: 'Cost and who pays', print: ({ value }) => moneyText(value as Money) },
}
const working = {
  title: 'Appendix: working',
  print: ({ value }: Figure) => trimmedNumber(Number(value), 4),
}

const plain = (text: string): string => text.replaceAll('\u00A0', ' ').replace(/\s+/g, ' ')

function pagesTitled({ result, pageTexts }: TourRun, title: string): string {
  const numbers = result.pages.filter((page) => page.title.startsWith(title)).map(({ number }) => number)
  return plain(numbers.map((number) => pageTexts[number - 1]).join(' '))
}

/** A number inside a longer one is another number. */
const holds = (text: string, printed: string): boolean =>
  text.split(printed).some((before, index, all) => {
    const after = all[index + 1]
    return after !== undefined && !/[\d.,]$/.test(before) && !/^\d/.test(after)
  })

function missingFigures(run: TourRun): string[] {
  return Object.entries(run.result.figures).flatMap(([name, figure]) => {
    const { title, print } = places[name.split('.')[0] ?? ''] ?? working
    const printed = plain(print(figure))
    return holds(pagesTitled(run, title), printed) ? [] : [`${name}: ${printed} is not on "${title}"`]
  })
}

async function expectWholeTour(run: TourRun): Promise<void> {
  expect(Object.keys(run.result.figures).length).toBeGreaterThan(60)
  expect(missingFigures(run)).toEqual([])
  const packetB = run.result.packets.find(({ kind }) => kind === 'B')
  expect(createHash('sha256').update(run.attachment).digest('hex')).toBe(packetB?.sha256)
  expect(await qpdfCheck(run.pdfFile)).toContain('No syntax or stream encoding errors found')
  const states = run.result.steps.flatMap(({ state }) => (state === undefined ? [] : [state]))
  expect(states).toEqual([
    'draft',
    'with-landowner',
    'returned',
    'with-landowner',
    'with-supervisor',
    'returned',
    'with-landowner',
    'with-supervisor',
    'approved',
    'sent',
  ])
}

const shareOf = ({ result }: TourRun): string => String(result.figures['funding.landownerShare']?.value)

test('the tour of each example ends with a packet that holds every figure on the page it belongs to', async () => {
  const northPond = await tour('north-pond')
  const lowerTank = await tour('lower-tank')
  await expectWholeTour(northPond)
  await expectWholeTour(lowerTank)
  expect(shareOf(northPond)).not.toBe(shareOf(lowerTank))
})

test('a second tour on the same database gives the same figures in a job of its own', async () => {
  const first = await tour('north-pond')
  const second = await tour('north-pond')
  expect(second.result.figures).toEqual(first.result.figures)
  expect(second.result.packets.map(({ id }) => id)).not.toEqual(first.result.packets.map(({ id }) => id))
})

test('an input changed by hand gives other figures, again each on its page', async () => {
  const asIs = await tour('lower-tank')
  const file = changedExample('lower-tank', ({ plan, costList }) => {
    if (plan.herd) plan.herd.headCount -= 3
    for (const layer of plan.rock?.layers ?? []) layer.wastePercent += 4
    for (const line of costList.lines) line.typical = line.high
  })
  const changed = await tour('lower-tank', file)
  await expectWholeTour(changed)
  expect(shareOf(changed)).not.toBe(shareOf(asIs))
  expect(changed.result.figures['quantities.stone-surface']).not.toEqual(
    asIs.result.figures['quantities.stone-surface'],
  )
})

test('the tour stops when a schedule line it needs is not mapped, and says which', async () => {
  const file = changedExample('north-pond', ({ schedules }) => {
    const line = schedules[0]?.lines.find(({ quantityKey }) => quantityKey === 'stone-surface')
    if (line) line.quantityKey = null
  })
  const { code, said } = await stoppedTour('north-pond', file)
  expect(code).not.toBe(0)
  expect(said).toContain('stone-surface')
  expect(said).toContain('not mapped')
})
