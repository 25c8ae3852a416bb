import { unitText } from 'shared'

/** What a price is for: each, a ton, an acre. */
export function perUnit(unit: string): string {
  if (unit === 'each') return 'each'
  const one = unitText(unit, 1)
  return `${/^[aeio]/.test(one) ? 'an' : 'a'} ${one}`
}
