import { atSentenceStart, formatFeet, formatPercent, levelNames, numberText, readyValue } from 'shared'
import type { Block, PageDraft } from '../layout/block.js'
import type { PacketSource } from '../packet-source.js'

interface Fact {
  name: string
  value: string
}

/** Where the job lies, the water, the herd, and how the ground was measured. */
export function sitePage(source: PacketSource): PageDraft {
  return {
    title: 'Site and herd',
    blocks: [
      { kind: 'heading', text: 'Place' },
      { kind: 'facts', facts: placeFacts(source) },
      { kind: 'heading', text: 'Levels' },
      { kind: 'facts', facts: levelFacts(source) },
      ...herdBlocks(source),
      { kind: 'heading', text: 'Survey' },
      { kind: 'facts', facts: surveyFacts(source) },
      { kind: 'heading', text: 'Made with' },
      { kind: 'facts', facts: madeWith(source) },
    ],
  }
}

const given = (name: string, value: string | undefined): Fact[] => (value ? [{ name, value }] : [])

function placeFacts({ job, plan }: PacketSource): Fact[] {
  return [
    { name: 'Water', value: `${job.waterName} (${job.body})` },
    { name: 'County', value: job.county },
    ...given(
      'Farm, tract, field',
      [job.farmNumber, job.tractNumber, job.fieldNumber].filter(Boolean).join(', '),
    ),
    ...given('Legal description', job.legalDescription),
    ...given('Soil', plan.site?.soil),
  ]
}

function levelFacts({ plan }: PacketSource): Fact[] {
  const site = plan.site
  if (!site) return []
  const names = levelNames[site.body]
  const level = (name: string, value: number | undefined): Fact[] =>
    value === undefined ? [] : [{ name, value: formatFeet(value, 2) }]
  return [
    ...level(atSentenceStart(names.high), site.fullPoolElevationFt),
    ...level(atSentenceStart(names.low), site.lowWaterElevationFt),
    ...level('Water while building', site.waterSurfaceTodayFt),
    ...level('Flood pool', site.floodPoolElevationFt),
    ...level('Top of the dam', site.topOfDamElevationFt),
  ]
}

function herdBlocks({ plan, result }: PacketSource): Block[] {
  const herd = readyValue(result.herd)
  if (!herd || !plan.herd) return []
  const facts = [
    { name: 'Animals', value: `${numberText(herd.headCount)} head` },
    {
      name: 'Drinking at once',
      value: `${numberText(herd.drinkingAtOnce)} head (${formatPercent(plan.herd.shareAtOncePercent)}), needing ${formatFeet(herd.frontageNeededFt)} of edge`,
    },
    { name: 'Width by the herd', value: `at least ${formatFeet(herd.rampWidthFt)}` },
    { name: 'Water in a hot day', value: `${numberText(herd.dailyWater.totalGal)} gallons` },
    ...herd.dailyWater.classes.map((one) => ({
      name: one.kind,
      value: `${numberText(one.perHeadGal, 1)} gallons a head (${one.row}; ${one.source})`,
    })),
  ]
  return [
    { kind: 'heading', text: 'Herd' },
    { kind: 'facts', facts },
  ]
}

function surveyFacts({ survey }: PacketSource): Fact[] {
  const first = survey.groundLine[0]
  const last = survey.groundLine.at(-1)
  const lengthFt = first && last ? last.stationFt - first.stationFt : 0
  const how =
    survey.survey.kind === 'level-notes' ? 'from level notes, see the appendix' : 'typed or uploaded'
  const reduction = survey.reduction
  return [
    {
      name: 'Ground line',
      value: `${survey.groundLine.length} points over ${formatFeet(lengthFt, 0)}, ${how}`,
    },
    ...given('Check', reduction ? checkText(reduction) : undefined),
  ]
}

function checkText(reduction: NonNullable<PacketSource['survey']['reduction']>): string {
  const { arithmeticCheckPasses, misclosureFt, allowableFt, closes } = reduction
  const sums = arithmeticCheckPasses ? 'The notes add up' : 'The notes do not add up'
  if (misclosureFt === undefined || allowableFt === undefined) return `${sums}.`
  const verdict = closes ? 'it closes' : 'it does not close'
  return `${sums}. Misclosure ${formatFeet(misclosureFt, 3)}, allowed ${formatFeet(allowableFt, 3)}: ${verdict}.`
}

function madeWith({ criteriaSet, costList, schedules, result }: PacketSource): Fact[] {
  return [
    ...given(
      'Criteria',
      criteriaSet ? `${criteriaSet.name}, in force from ${criteriaSet.effectiveFrom}` : undefined,
    ),
    ...given(
      'Unit costs',
      costList ? `${costList.name}, from ${costList.effectiveFrom} (${costList.source})` : undefined,
    ),
    ...schedules.map((schedule) => ({
      name: 'Payment schedule',
      value: `${schedule.name}, fiscal year ${schedule.fiscalYear}, ${schedule.effectiveFrom} to ${schedule.effectiveTo}`,
    })),
    { name: 'Calculation', value: result.calculationVersion },
  ]
}
