/** A figure as it stands in an error sentence: at most three decimals, no trailing zeros. */
export function forWords(value: number): string {
  return String(Number(value.toFixed(3)))
}
