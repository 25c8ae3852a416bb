import type { Shape } from 'shared'
import type { PageNode } from '../packet-document.js'

/** The smallest thing that is never torn by a page's end, with its own top left at 0, 0. */
export interface Piece {
  heightMm: number
  gapBeforeMm: number
  node: PageNode | null
  art: Shape[]
  /** A heading is never left alone at a page's foot. */
  keepWithNext?: boolean
  /** Rows of one table and items of one list: they share a node, and a table's head comes again on each page. */
  group?: { id: string; tag: 'Table' | 'L'; head?: Piece }
}

export const node = (tag: PageNode['tag'], content: Partial<Omit<PageNode, 'tag'>> = {}): PageNode => ({
  tag,
  texts: [],
  children: [],
  ...content,
})
