import { numberText } from './number-text.js'

/** At most so many decimals, without zeros at the end: trimmedNumber(6.5, 2) is "6.5", trimmedNumber(6, 2) is "6". */
export function trimmedNumber(value: number, mostPlaces: number): string {
  const text = numberText(value, mostPlaces)
  return text.includes('.') ? text.replace(/\.?0+$/, '') : text
}
