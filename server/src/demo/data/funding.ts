import type { DesignPlan } from 'shared'

type Funding = NonNullable<DesignPlan['funding']>

/** What is contracted by the unit comes first, then the share of what is left. */
const bothFunds =
  (unitKey: string, percentKey: string) =>
  (contracted: Record<string, number>): Funding => ({
    sources: [
      { scheduleKey: unitKey, rate: 'base', contracted },
      { scheduleKey: percentKey, rate: 'base' },
    ],
  })

const contractedOn = (fund: (contracted: Record<string, number>) => Funding) => ({
  hillPond: fund({ 'stone-surface': 38, 'stone-base': 36, 'fence-electric': 1150, seeding: 0.15 }),
  valleyTank: fund({ 'stone-surface': 34, 'stone-base': 32, 'fence-electric': 950, seeding: 0.15 }),
  creekReach: fund({ 'stone-surface': 22, 'stone-base': 20, 'fence-electric': 1100, seeding: 0.12 }),
})

export const sableBasinFunding = contractedOn(bothFunds('sable-basin-water-fund', 'county-clean-creek-share'))
export const corrowForkFunding = contractedOn(
  bothFunds('corrow-fork-pasture-fund', 'vesper-county-water-share'),
)
