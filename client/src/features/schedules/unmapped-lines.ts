import type { ScheduleLine } from 'shared'

export type NamedLine = Pick<ScheduleLine, 'code' | 'title'>

/** Lines that pay for none of our quantities. */
export const unmappedLines = <Line extends NamedLine & { quantityKey?: string | null }>(
  lines: readonly Line[],
): Line[] => lines.filter(({ quantityKey }) => !quantityKey)
