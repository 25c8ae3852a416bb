import type { Shape, Tone } from 'shared'

export interface TableColumn {
  title: string
  /** Part of the table's width. */
  share: number
  align?: 'left' | 'right'
}

export interface TableRow {
  cells: string[]
  /** A sum stands under a double rule and in bold; a part names the rows below it. */
  kind?: 'sum' | 'part'
}

/** What a page says, before anybody knows where it will stand. */
export type Block =
  | { kind: 'heading'; text: string }
  | {
      kind: 'paragraph'
      text: string
      tone?: Tone
      weight?: 'regular' | 'bold'
      size?: 'text' | 'lead' | 'small'
    }
  | { kind: 'list'; items: string[]; marker?: 'dash' | 'number' | 'box' }
  | { kind: 'facts'; facts: { name: string; value: string }[] }
  | { kind: 'figures'; figures: { name: string; value: string; unit: string }[] }
  | { kind: 'table'; columns: TableColumn[]; rows: TableRow[] }
  | { kind: 'signature'; role: string; name: string }
  | { kind: 'picture'; heightMm: number; alt: string; draw: (widthMm: number) => Shape[] }
  | { kind: 'contents'; pages: { number: number; title: string }[] }
  | { kind: 'gap'; heightMm: number }

export interface PageDraft {
  title: string
  blocks: Block[]
}
