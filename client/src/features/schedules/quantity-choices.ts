import { quantityCatalogue, quantityKeys, unitText, type QuantityKey } from 'shared'
import type { Choice } from '../../components/fields/select-field'

export const isQuantityKey = (key: string | null | undefined): key is QuantityKey =>
  typeof key === 'string' && key in quantityCatalogue

/** A line of the bill of quantities as people read it: what it is, its unit, its practice. */
export function quantityWords(key: string): string {
  if (!isQuantityKey(key)) return key
  const { description, unit, practice } = quantityCatalogue[key]
  return `${description} (${unitText(unit) || 'each'}, ${practice})`
}

export const quantityChoices: readonly Choice[] = quantityKeys.map((key) => ({
  value: key,
  label: quantityWords(key),
}))

/** What a line pays for, also when that is nothing. */
export const payWords = (key: string | null): string =>
  key === null ? 'nothing of ours' : quantityWords(key)
