import type { JobInput } from 'shared'

export interface TextItem {
  text: string
  /** Who published it; or that nobody did. */
  source: string
  /** Left out: for every kind of water. */
  bodies?: readonly JobInput['body'][]
}

/** Words of the packet, kept as data with a version, so that a packet can say which words it carries. */
export interface TextBlock {
  version: string
  title: string
  lead: string
  items: readonly TextItem[]
}

export const itemsFor = (block: TextBlock, body: JobInput['body']): TextItem[] =>
  block.items.filter(({ bodies }) => !bodies || bodies.includes(body))

/** Which items rest on which source: "Kansas State …: 2, 5 and 9." */
export function sourceLines(items: readonly TextItem[]): string[] {
  const bySource = new Map<string, number[]>()
  items.forEach(({ source }, index) => bySource.set(source, [...(bySource.get(source) ?? []), index + 1]))
  return [...bySource].map(([source, numbers]) => `${source}: ${numbers.join(', ')}.`)
}
