import {
  feetAndInches,
  formatQuantity,
  formatRatio,
  numberText,
  readyValue,
  type DesignResult,
  type QuantityLine,
} from 'shared'
import type { PacketSource } from '../packet-source.js'

export interface NamedFigure {
  name: string
  value: string
  unit: string
}

const lineOf = (result: DesignResult, key: string): QuantityLine | undefined =>
  readyValue(result.quantities)?.find((line) => line.key === key)

/** The measures that decide a job, as cover and quantities print them. */
export function namedFigures({ plan, result }: Pick<PacketSource, 'plan' | 'result'>): NamedFigure[] {
  const profile = readyValue(result.profile)
  const rock = readyValue(result.rock)
  const fence = readyValue(result.fence)
  const berm = readyValue(result.berm)
  const fabric = lineOf(result, 'fabric')
  const fenceFt = fence?.runs.reduce((sum, run) => sum + run.lengthFt, 0)
  const figures: (NamedFigure | false | undefined | null)[] = [
    plan.ramp && {
      name: 'Grade of the ramp, run to rise',
      value: formatRatio(plan.ramp.gradeRunPerRise),
      unit: '',
    },
    plan.ramp && {
      name: 'Width of the ramp',
      value: feetAndInches(plan.ramp.widthFt),
      unit: `(${numberText(plan.ramp.widthFt, 1)} ft)`,
    },
    profile && { name: 'Length along the slope', value: numberText(profile.slopeLengthFt, 1), unit: 'ft' },
    rock && { name: 'Stone to order for the ramp', value: numberText(rock.totalOrderTons, 1), unit: 'tons' },
    fabric && { name: 'Fabric under the ramp', value: numberText(fabric.quantity, 1), unit: 'yd²' },
    fenceFt !== undefined && { name: 'Fence, all runs', value: numberText(fenceFt), unit: 'ft' },
    berm && { name: 'Length of the berm', value: numberText(berm.lengthFt, 1), unit: 'ft' },
  ]
  return figures.filter((figure): figure is NamedFigure => Boolean(figure))
}

export const quantityText = (line: QuantityLine): string => formatQuantity(line.quantity, line.unit)
