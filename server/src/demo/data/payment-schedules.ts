import {
  quantityCatalogue,
  type Money,
  type QuantityKey,
  type ScheduleInput,
  type ScheduleLine,
} from 'shared'

type Rates = readonly [key: QuantityKey, title: string, base: string, higher?: string][]

/** Codes of our own: the letters of the fund and a count. */
const linesOf = (letters: string, rates: Rates): ScheduleLine[] =>
  rates.map(([quantityKey, title, baseRate, higherRate], index) => ({
    code: `${letters}-${String(index + 1).padStart(2, '0')}`,
    practice: quantityCatalogue[quantityKey].practice,
    title,
    unit: quantityCatalogue[quantityKey].unit,
    baseRate,
    ...(higherRate === undefined ? {} : { higherRate }),
    quantityKey,
  }))

/** From the fiscal year that began last autumn to the end of the next year, so that the examples stay payable. */
const inForce = (year: number) => ({
  fiscalYear: year,
  effectiveFrom: `${year - 1}-10-01`,
  effectiveTo: `${year + 1}-12-31`,
})

const unitRates: Rates = [
  ['stone-surface', 'Surface stone, in place', '24.00', '28.80'],
  ['stone-base', 'Base stone, in place', '22.00', '26.40'],
  ['fence-electric', 'Electric fence, three wires', '2.10', '2.52'],
  ['seeding', 'Seeding of disturbed ground', '410.00', '492.00'],
]

const averageCosts: Rates = [
  ['excavation-dry', 'Excavation, dry', '4.00'],
  ['excavation-wet', 'Excavation, under water', '8.00'],
  ['earth-fill', 'Earth fill', '4.50'],
  ['stone-surface', 'Surface stone', '29.00'],
  ['stone-base', 'Base stone', '29.00'],
  ['fabric', 'Fabric under the ramp', '1.80'],
  ['fabric-pad', 'Fabric under the pad', '1.80'],
  ['fence-electric', 'Electric fence', '1.80'],
  ['closing-panel', 'Closing panel', '6.00'],
  ['gate', 'Gate', '230.00'],
  ['energizer-and-grounding', 'Energizer and ground rods', '400.00'],
  ['berm', 'Berm', '5.00'],
  ['seeding', 'Seeding', '600.00'],
]

const byUnit = (year: number, fund: Pick<ScheduleInput, 'key' | 'name' | 'lines'>): ScheduleInput => ({
  ...fund,
  ...inForce(year),
  kind: 'unit-rate',
  advancePercent: 50,
})

interface PercentFund extends Pick<ScheduleInput, 'key' | 'name' | 'lines'> {
  percent: number
  cap: string
}

const byPercent = (year: number, { cap, ...fund }: PercentFund): ScheduleInput => ({
  ...fund,
  ...inForce(year),
  kind: 'percent-of-cost',
  percentOf: 'cost-after-earlier-sources',
  cap: cap as Money,
})

export const sableBasinSchedules = (year: number): ScheduleInput[] => [
  byUnit(year, {
    key: 'sable-basin-water-fund',
    name: 'Sable Basin Water Fund (example)',
    lines: linesOf('SB', unitRates),
  }),
  byPercent(year, {
    key: 'county-clean-creek-share',
    name: 'County Clean Creek Share (example)',
    percent: 75,
    cap: '4500.00',
    lines: linesOf('CC', averageCosts),
  }),
]

export const corrowForkSchedules = (year: number): ScheduleInput[] => [
  byUnit(year, {
    key: 'corrow-fork-pasture-fund',
    name: 'Corrow Fork Pasture Fund (example)',
    lines: linesOf('CF', unitRates),
  }),
  byPercent(year, {
    key: 'vesper-county-water-share',
    name: 'Vesper County Water Share (example)',
    percent: 60,
    cap: '3500.00',
    lines: linesOf('VW', averageCosts),
  }),
]
