import type { CostListInput, QuantityKey } from 'shared'

type Prices = readonly [key: QuantityKey, low: string, typical: string, high: string][]

const sableBasinPrices: Prices = [
  ['excavation-dry', '4.05', '4.50', '5.20'],
  ['excavation-wet', '8.10', '9.00', '10.35'],
  ['earth-fill', '4.50', '5.00', '5.75'],
  ['stone-surface', '27.90', '31.00', '35.65'],
  ['stone-base', '25.65', '28.50', '32.80'],
  ['fabric', '1.65', '1.85', '2.15'],
  ['fabric-pad', '1.65', '1.85', '2.15'],
  ['fence-electric', '1.75', '1.95', '2.25'],
  ['fence-barbed', '2.30', '2.60', '3.00'],
  ['closing-panel', '6.75', '7.50', '8.60'],
  ['gate', '220.00', '245.00', '280.00'],
  ['energizer-and-grounding', '350.00', '390.00', '450.00'],
  ['berm', '4.75', '5.25', '6.05'],
  ['seeding', '560.00', '620.00', '715.00'],
]

const corrowForkPrices: Prices = [
  ['excavation-dry', '4.70', '5.20', '6.00'],
  ['excavation-wet', '9.90', '11.00', '12.65'],
  ['earth-fill', '5.05', '5.60', '6.45'],
  ['stone-surface', '33.00', '36.50', '42.00'],
  ['stone-base', '29.50', '32.75', '37.65'],
  ['fabric', '1.90', '2.10', '2.40'],
  ['fabric-pad', '1.90', '2.10', '2.40'],
  ['fence-electric', '2.00', '2.25', '2.60'],
  ['closing-panel', '7.40', '8.25', '9.50'],
  ['gate', '240.00', '265.00', '305.00'],
  ['energizer-and-grounding', '385.00', '430.00', '495.00'],
  ['berm', '5.40', '6.00', '6.90'],
  ['seeding', '610.00', '680.00', '780.00'],
]

const listOf =
  (prices: Prices) =>
  (year: number): CostListInput => ({
    name: `Unit costs ${year} (example)`,
    effectiveFrom: `${year}-01-01`,
    source: 'invented prices, example data',
    lines: prices.map(([key, low, typical, high]) => ({ key, low, typical, high })),
  })

export const sableBasinCosts = listOf(sableBasinPrices)
export const corrowForkCosts = listOf(corrowForkPrices)
