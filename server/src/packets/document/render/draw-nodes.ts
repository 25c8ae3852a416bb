import type { PageNode } from '../packet-document.js'
import { drawShapes } from './draw-shapes.js'

type Doc = PDFKit.PDFDocument
type Element = PDFKit.PDFStructureElement

/** Puts a node on the page inside its tag, children in reading order. */
export function structureOf(doc: Doc, one: PageNode): Element {
  const options = {
    ...(one.alt ? { alt: one.alt } : {}),
    ...(one.scope ? { scope: one.scope } : {}),
  }
  const own = () => drawShapes(doc, [...(one.shapes ?? []), ...one.texts])
  const hasOwn = one.texts.length > 0 || (one.shapes?.length ?? 0) > 0
  return doc.struct(one.tag, options, [
    ...(hasOwn ? [own] : []),
    ...one.children.map((child) => structureOf(doc, child)),
  ])
}
