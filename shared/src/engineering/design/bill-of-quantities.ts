import { roundedQuantity } from '../../money/rounded-quantity.js'
import type { DesignInput } from './design-input.js'
import type { PartValues } from './design-result.js'
import { quantityCatalogue, quantityKeys, type QuantityKey } from './quantity-catalogue.js'
import type { QuantityLine } from './quantity-line.js'

export interface BillInput {
  plan: Required<Pick<DesignInput, 'rock' | 'fence'>>
  parts: Pick<
    PartValues,
    'earthwork' | 'rock' | 'fabric' | 'approachPad' | 'closingPanel' | 'fence' | 'berm' | 'seeding'
  >
}

interface Taken {
  quantity: number
  inPlace?: number
  from: string
}

const FT2_PER_YD2 = 9

/**
 * The one list that cost, funding, packet and check-out share. Every quantity is rounded once, by the rule of its unit;
 * lines that come to nothing are left out.
 */
export function billOfQuantities(input: BillInput): QuantityLine[] {
  const taken = {
    ...earthLines(input),
    ...stoneLines(input),
    ...fabricLines(input),
    ...fenceLines(input),
    ...restLines(input),
  }
  return quantityKeys.flatMap((key) => {
    const line = lineOf(key, taken[key])
    return line.quantity > 0 ? [line] : []
  })
}

function lineOf(key: QuantityKey, { quantity, inPlace = quantity, from }: Taken): QuantityLine {
  const { practice, description, unit, basis } = quantityCatalogue[key]
  return {
    key,
    practice,
    description,
    unit,
    quantity: roundedQuantity(quantity, unit),
    inPlaceQuantity: roundedQuantity(inPlace, unit),
    basis,
    fromFigure: from,
  }
}

/** Exact volumes, by the prismoidal formula; bank measure for what is dug, compacted for what is filled. */
function earthLines({ parts: { earthwork } }: BillInput) {
  const { dryCutBankYd3, wetCutBankYd3, compactedNeededYd3 } = earthwork.balance
  return {
    'excavation-dry': { quantity: dryCutBankYd3, from: 'earthwork and pad: dry cut, bank measure' },
    'excavation-wet': { quantity: wetCutBankYd3, from: 'earthwork: cut below the water, with the end cut' },
    'earth-fill': { quantity: compactedNeededYd3, from: 'earthwork: fill and edge backfill, compacted' },
  }
}

function stoneLines({ plan, parts: { rock, approachPad } }: BillInput) {
  const sum = (role: 'surface' | 'base', pick: (layer: (typeof rock.layers)[number]) => number) =>
    rock.layers.reduce(
      (tons, layer, index) => tons + (plan.rock.layers[index]?.role === role ? pick(layer) : 0),
      0,
    )
  const ordered = (role: 'surface' | 'base') => sum(role, ({ orderTons }) => orderTons)
  const placed = (role: 'surface' | 'base') => sum(role, ({ tons }) => tons)
  return {
    'stone-surface': {
      quantity: ordered('surface') + (approachPad?.orderTons ?? 0),
      inPlace: placed('surface') + (approachPad?.tons ?? 0),
      from: 'rock: surface layers and pad, with waste',
    },
    'stone-base': {
      quantity: ordered('base'),
      inPlace: placed('base'),
      from: 'rock: base layers, with waste',
    },
  }
}

function fabricLines({ parts: { fabric, approachPad } }: BillInput) {
  return {
    fabric: {
      quantity: fabric[fabric.recommended].grossAreaFt2 / FT2_PER_YD2,
      inPlace: fabric.netAreaFt2 / FT2_PER_YD2,
      from: `fabric laid ${fabric.recommended} the ramp, with laps and trim`,
    },
    'fabric-pad': {
      quantity: (approachPad?.fabricAreaFt2 ?? 0) / FT2_PER_YD2,
      from: 'pad: area covered with turn-ups and the lap over the ramp fabric',
    },
  }
}

function fenceLines({ plan, parts: { fence, closingPanel } }: BillInput) {
  const lengthOf = (wanted: (run: (typeof plan.fence.runs)[number]) => boolean) =>
    fence.runs.reduce((sum, { fencedLengthFt }, index) => {
      const run = plan.fence.runs[index]
      return sum + (run && wanted(run) ? fencedLengthFt : 0)
    }, 0)
  const ofKind = (kind: string) => ({
    quantity: lengthOf(({ role, fence: built }) => role !== 'closing' && built === kind),
    from: 'fence: runs of this kind, gates taken off',
  })
  const isEnergized = plan.fence.runs.some(({ energized }) => energized)
  return {
    'fence-electric': ofKind('electric'),
    'fence-barbed': ofKind('barbed'),
    'fence-woven': ofKind('woven'),
    'fence-smooth': ofKind('smooth'),
    'closing-panel': closingPanel
      ? { quantity: closingPanel.lengthFt, from: 'closing panel: two sides and the end' }
      : { quantity: lengthOf(({ role }) => role === 'closing'), from: 'fence: closing runs' },
    gate: {
      quantity: plan.fence.runs.reduce((sum, { gates }) => sum + gates.length, 0),
      from: 'fence: gates',
    },
    'energizer-and-grounding': { quantity: isEnergized ? 1 : 0, from: 'fence: one energizer for all runs' },
  }
}

function restLines({ parts: { berm, seeding } }: BillInput) {
  return {
    berm: { quantity: berm.earthCompactedYd3, from: 'berm: section as built times length' },
    seeding: { quantity: seeding.acres, from: 'seeding: disturbed ground' },
  }
}
