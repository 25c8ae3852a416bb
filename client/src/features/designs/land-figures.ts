import { formatQuantity, moneyText, type DesignResult, type PartValues } from 'shared'
import { line, lineIfAny, said, type FigureLine } from './figure-line'

const FT2_PER_ACRE = 43_560

export const fenceFigures = (fence: PartValues['fence']): FigureLine[] => [
  ...fence.runs.map(({ name, fencedLengthFt }) => line(name, fencedLengthFt, 'ft', 0)),
  { ...line('Fence in all', fence.fencedLengthFt, 'ft', 0), isSum: true },
  line('Line posts', fence.posts.line, undefined, 0),
  line('Braces', fence.braces.total, undefined, 0),
  line('Gates', fence.gates.count, undefined, 0),
  ...fence.wire.map(({ kind, rolls }) => line(`Rolls, ${kind}`, rolls, undefined, 0)),
  ...lineIfAny('Energizer', fence.energizer?.sizeJoules ?? fence.energizer?.neededJoules, 'joules', 1),
  ...lineIfAny('Ground rods', fence.energizer?.rods, undefined, 0),
  ...lineIfAny('Setback from the water', fence.setbackFt, 'ft', 1),
  ...(fence.habitatAreaFt2 === undefined
    ? []
    : [line('Set aside for habitat', fence.habitatAreaFt2 / FT2_PER_ACRE, 'acres')]),
]

export const runoffFigures = (runoff: PartValues['runoff']): FigureLine[] => [
  line('Runoff', runoff.runoffDepthIn, 'in'),
  line('Time of concentration', runoff.timeOfConcentrationHr, 'h'),
  ...lineIfAny('Peak, curve number', runoff.graphicalPeakCfs, 'ft³/s', 1),
  ...lineIfAny('Peak, rational', runoff.rationalPeakCfs, 'ft³/s', 1),
  line('Design peak', runoff.designPeakCfs, 'ft³/s', 1),
]

export const bermFigures = (berm: PartValues['berm']): FigureLine[] => [
  line('Depth of the water', berm.depthFt, 'ft'),
  line('Velocity', berm.velocityFtPerS, 'ft/s', 1),
  line('Height when built', berm.builtHeightFt, 'ft'),
  line('Height when settled', berm.settledHeightFt, 'ft'),
  said('Height follows from', berm.heightGovernedBy),
  line('Width of the base', berm.baseWidthFt, 'ft', 1),
  line('Length', berm.lengthFt, 'ft', 0),
  line('Earth, compacted', berm.earthCompactedYd3, 'yd³', 1),
]

export const pondFigures = (pond: NonNullable<PartValues['pond']>): FigureLine[] => [
  line('Used and lost in a day', pond.usePerDayFt3, 'ft³', 0),
  line('Days of supply', pond.daysOfSupply, 'days', 0),
]

export const seedingFigures = (seeding: PartValues['seeding']): FigureLine[] => [
  line('Ground to sow', seeding.acres, 'acres'),
  ...seeding.mix.map(({ species, bulkLb }) => line(`${species}, to buy`, bulkLb, 'lb', 1)),
  line('Mulch', seeding.mulchTons, 'tons'),
]

type Ready<Part> = Extract<Part, { ok: true }> extends { value: infer Value } ? Value : never

export const quantityFigures = (quantities: Ready<DesignResult['quantities']>): FigureLine[] =>
  quantities.map(({ description, quantity, unit }) => said(description, formatQuantity(quantity, unit)))

export const costFigures = ({ low, typical, high }: Ready<DesignResult['cost']>): FigureLine[] => [
  said('Low', moneyText(low)),
  said('Typical', moneyText(typical)),
  said('High', moneyText(high)),
]

export const fundingFigures = (funding: Ready<DesignResult['funding']>): FigureLine[] => [
  ...funding.sources.map(({ name, paid }) => said(name, moneyText(paid))),
  said('Funds together', moneyText(funding.totalPaid)),
  { ...said('Left to the landowner', moneyText(funding.landownerShare)), isSum: true },
]
