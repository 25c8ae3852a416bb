import { textWidthMm, type Point, type Shape, type Stroke, type TextShape } from 'shared'
import { fonts } from './fonts.js'
import { inks, POINTS_PER_MM } from '../theme.js'

type Doc = PDFKit.PDFDocument

const pt = (mm: number) => mm * POINTS_PER_MM
const shareBefore = { left: 0, center: 0.5, right: 1 } as const

/** Puts shapes on the current page one by one, in millimetres from its top left. */
export function drawShapes(doc: Doc, shapes: readonly Shape[]): void {
  shapes.forEach((shape) => drawShape(doc, shape))
}

function drawShape(doc: Doc, shape: Shape): void {
  if (shape.kind === 'text') return drawText(doc, shape)
  if (shape.stroke) setPen(doc, shape.stroke)
  if (shape.kind === 'polyline') {
    if (shape.lines.length === 0) return
    shape.lines.forEach((line) => trace(doc, line))
    doc.stroke()
    return
  }
  if (shape.rings.length === 0) return
  shape.rings.forEach((ring) => trace(doc, ring).closePath())
  if (shape.fill && shape.stroke) doc.fillAndStroke(inks[shape.fill], inks[shape.stroke.tone])
  else if (shape.fill) doc.fill(inks[shape.fill])
  else doc.stroke()
}

function setPen(doc: Doc, { tone, widthMm, dashMm }: Stroke): void {
  doc.lineWidth(pt(widthMm)).strokeColor(inks[tone])
  // The types know one length only; the library itself takes the whole pattern.
  if (dashMm) doc.dash(dashMm.map(pt) as unknown as number, {})
  else doc.undash()
}

function trace(doc: Doc, points: readonly Point[]): Doc {
  points.forEach(({ x, y }, index) => (index === 0 ? doc.moveTo(pt(x), pt(y)) : doc.lineTo(pt(x), pt(y))))
  return doc
}

function drawText(doc: Doc, shape: TextShape): void {
  const { at, text, sizeMm, weight, align, tone, angleDeg } = shape
  const x = pt(at.x)
  const y = pt(at.y)
  doc.save()
  if (angleDeg) doc.rotate(-angleDeg, { origin: [x, y] })
  doc.font(fonts[weight]).fontSize(pt(sizeMm)).fillColor(inks[tone])
  const left = x - shareBefore[align] * pt(textWidthMm({ text, sizeMm, weight }))
  doc.text(text, left, y, { lineBreak: false, baseline: 'alphabetic' })
  doc.restore()
}
