import { quantityCatalogue, quantityKeys, unitText, type ScheduleLine } from 'shared'
import { isSameUnit } from './unit-spellings.js'

type MappedLine = Pick<ScheduleLine, 'code' | 'unit' | 'quantityKey'>

const counted: ReadonlyMap<string, { description: string; unit: string }> = new Map(
  Object.entries(quantityCatalogue),
)

/**
 * What stands against each mapping, in the order of the lines; null where it is good. Of two lines that pay for the
 * same quantity the later one is named: both together would pay it twice.
 */
export function mappingTroubles(lines: readonly MappedLine[]): (string | null)[] {
  const payers = new Map<string, string>()
  return lines.map((line) => {
    const { code, quantityKey } = line
    if (quantityKey === null) return null
    const payer = payers.get(quantityKey)
    if (payer === undefined) payers.set(quantityKey, code)
    return ownTrouble(line, quantityKey) ?? (payer === undefined ? null : twicePaid(line, quantityKey, payer))
  })
}

function ownTrouble({ code, unit }: MappedLine, quantityKey: string): string | null {
  const quantity = counted.get(quantityKey)
  if (quantity === undefined) {
    return `Line ${code} is mapped to "${quantityKey}", which no design counts. The quantities are ${quantityKeys.join(', ')}.`
  }
  if (isSameUnit(unit, quantity.unit)) return null
  const unitWanted = unitText(quantity.unit, 1) || quantity.unit
  return `Line ${code} pays by "${unit}", but ${quantity.description} is counted by ${unitWanted}. Rates are not converted: give the rate by ${unitWanted}, or leave the line unmapped.`
}

const twicePaid = ({ code }: MappedLine, quantityKey: string, payer: string): string =>
  `Line ${code} pays for ${quantityKey}, and so does line ${payer}. Map only one of them.`
