import { boxesOverlap, holdsPoint, insetBox, ringOf } from './geometry/boxes.js'
import { linesCross } from './geometry/lines-cross.js'
import { clipPolyline } from './geometry/clip-polyline.js'
import type { Box, Point, Shape, TextShape } from './shapes.js'
import { textBox } from './text-box.js'

export interface LabelRoom {
  /** Marks the ground under the texts of these shapes as taken. */
  take: (shapes: readonly Shape[]) => void
  takeBox: (box: Box) => void
  /** Marks a stroke that no other may cross. */
  takeLine: (line: readonly Point[]) => void
  isFree: (text: TextShape) => boolean
  /** Whether a stroke runs clear of every label and stroke. */
  isLineFree: (line: readonly Point[]) => boolean
  /** The first text that fits. None when all are taken: the words and the table of the sheet still name the thing. */
  firstFree: <Item extends { text: TextShape }>(candidates: readonly Item[]) => Item | undefined
}

const CLEAR_MM = 1.2

/** Keeps the account of where labels already stand, so that no two overlap. */
export function labelRoom(clip: Box): LabelRoom {
  const taken: Box[] = []
  const lines: (readonly Point[])[] = []
  const isFree = (text: TextShape) => {
    const box = textBox(text)
    const inside = ringOf(box).every((corner) => holdsPoint(clip, corner))
    return inside && !taken.some((other) => boxesOverlap(insetBox(box, -CLEAR_MM), other))
  }
  const isLineFree = (line: readonly Point[]) =>
    taken.every((box) => clipPolyline(line, box).length === 0) &&
    lines.every((other) => !linesCross(line, other))
  return {
    isLineFree,
    take: (shapes) =>
      taken.push(...shapes.flatMap((shape) => (shape.kind === 'text' ? [textBox(shape)] : []))),
    takeLine: (line) => lines.push(line),
    takeBox: (box) => taken.push(box),
    isFree,
    firstFree: (candidates) => candidates.find(({ text }) => isFree(text)),
  }
}
