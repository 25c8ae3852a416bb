import { moveShapes, type Shape } from 'shared'
import type { PageNode } from '../packet-document.js'
import { contentWidthMm, textPage, type } from '../theme.js'
import type { PageDraft } from './block.js'
import { layBlock } from './lay-block.js'
import { layLines } from './lay-lines.js'
import { node, type Piece } from './piece.js'

export interface LaidPage {
  title: string
  nodes: PageNode[]
  art: Shape[]
}

interface OpenPage extends LaidPage {
  yMm: number
  lastGroup?: string
}

const bottomMm = textPage.heightMm - textPage.bottomMm

/** Sets a draft on as many pages as it needs. A title that goes on says so. */
export function paginate(draft: PageDraft): LaidPage[] {
  const pieces = draft.blocks.flatMap((block, index) => layBlock(block, contentWidthMm, `block-${index}`))
  const pages: OpenPage[] = [openPage(draft.title)]
  pieces.forEach((piece, index) => {
    let page = pages[pages.length - 1] ?? openPage(draft.title)
    if (page.yMm + neededMm(pieces, index) > bottomMm) {
      page = openPage(`${draft.title}, continued`)
      pages.push(page)
      if (piece.group?.head && piece.group.head.node !== piece.node)
        place(page, { ...piece.group.head, group: piece.group })
    }
    place(page, piece)
  })
  return pages.map(({ title, nodes, art }) => ({ title, nodes, art }))
}

function openPage(title: string): OpenPage {
  const style = { ...type.title, weight: 'bold' as const }
  const texts = layLines({
    text: title,
    xMm: textPage.leftMm,
    widthMm: contentWidthMm,
    yMm: textPage.topMm,
    style,
  })
  const yMm = textPage.topMm + texts.length * style.lineMm + 1
  return { title, nodes: [node('H1', { texts })], art: [], yMm }
}

/** A heading needs room for what it heads; so does a table's head for its first row. */
function neededMm(pieces: readonly Piece[], index: number): number {
  const piece = pieces[index]
  if (!piece) return 0
  const own = piece.gapBeforeMm + piece.heightMm
  return piece.keepWithNext ? own + neededMm(pieces, index + 1) : own
}

function place(page: OpenPage, piece: Piece): void {
  const isFirst = page.nodes.length === 1
  const yMm = page.yMm + (isFirst ? 3 : piece.gapBeforeMm)
  const by = { x: textPage.leftMm, y: yMm }
  page.art.push(...moveShapes(piece.art, by))
  page.yMm = yMm + piece.heightMm
  if (!piece.node) return
  const moved = moveNode(piece.node, by)
  const { group } = piece
  const last = page.nodes[page.nodes.length - 1]
  if (group && page.lastGroup === group.id && last) last.children.push(moved)
  else page.nodes.push(group ? node(group.tag, { children: [moved] }) : moved)
  if (group) page.lastGroup = group.id
  else delete page.lastGroup
}

function moveNode(one: PageNode, by: { x: number; y: number }): PageNode {
  return {
    ...one,
    texts: moveShapes(one.texts, by),
    children: one.children.map((child) => moveNode(child, by)),
    ...(one.shapes ? { shapes: moveShapes(one.shapes, by) } : {}),
  }
}
