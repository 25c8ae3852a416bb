import { clipPolygon } from './geometry/clip-polygon.js'
import { clipPolyline } from './geometry/clip-polyline.js'
import type { Box, Point, Shape, View } from './shapes.js'

/** Feet on the ground to one inch of paper. Steps that stand on a scale rule, or halve one. */
const feetPerInch = [
  0.5, 1, 1.5, 2, 2.5, 3, 4, 5, 6, 8, 10, 15, 20, 25, 30, 40, 50, 60, 80, 100, 150, 200, 300,
]
const exaggerations = [3, 2, 1.5, 1]
const MM_PER_INCH = 25.4

export interface GroundWindow {
  from: Point
  to: Point
}

interface ViewRequest {
  key: string
  title: string
  clip: Box
  window: GroundWindow
  /** Largest vertical exaggeration wanted; 1 keeps true shape. */
  mostExaggeration?: number
  /** A scale to keep, so that views that are compared have one scale. */
  scaleFtPerInch?: number
}

/** Picks the largest round scale at which the window fits the clip, and centres the window in it. */
export function makeView(request: ViewRequest): View {
  const { clip, window, key, title } = request
  const widthFt = window.to.x - window.from.x
  const heightFt = window.to.y - window.from.y
  const scale = request.scaleFtPerInch ?? roundScale({ clip, widthFt, heightFt })
  const horizontal = MM_PER_INCH / scale
  const fits = (times: number) => heightFt * horizontal * times <= clip.bottom - clip.top + 1e-9
  const exaggeration =
    exaggerations.find((times) => times <= (request.mostExaggeration ?? 1) && fits(times)) ?? 1
  return {
    key,
    title,
    clip,
    scaleNote: scaleNote(scale, exaggeration),
    horizontalMmPerFt: horizontal,
    verticalMmPerFt: horizontal * exaggeration,
    exaggeration,
    originFt: { x: (window.from.x + window.to.x) / 2, y: (window.from.y + window.to.y) / 2 },
    originMm: { x: (clip.left + clip.right) / 2, y: (clip.top + clip.bottom) / 2 },
  }
}

export function roundScale(room: { clip: Box; widthFt: number; heightFt: number }): number {
  const perInch = Math.max(
    (room.widthFt * MM_PER_INCH) / (room.clip.right - room.clip.left),
    (room.heightFt * MM_PER_INCH) / (room.clip.bottom - room.clip.top),
  )
  const round = feetPerInch.find((step) => step >= perInch - 1e-9)
  return round ?? Math.ceil(perInch / 100) * 100
}

function scaleNote(ftPerInch: number, exaggeration: number): string {
  if (exaggeration === 1) return `1 in = ${ftPerInch} ft, true shape`
  const vertical = Math.round((ftPerInch / exaggeration) * 100) / 100
  return `Across 1 in = ${ftPerInch} ft, up 1 in = ${vertical} ft. Vertical exaggeration ${exaggeration}×`
}

/** A point on the ground to its place on paper. */
export const toPaper = (view: View, ground: Point): Point => ({
  x: view.originMm.x + (ground.x - view.originFt.x) * view.horizontalMmPerFt,
  y: view.originMm.y - (ground.y - view.originFt.y) * view.verticalMmPerFt,
})

export const toGround = (view: View, paper: Point): Point => ({
  x: view.originFt.x + (paper.x - view.originMm.x) / view.horizontalMmPerFt,
  y: view.originFt.y - (paper.y - view.originMm.y) / view.verticalMmPerFt,
})

export const lineToPaper = (view: View, line: readonly Point[]): Point[] =>
  line.map((point) => toPaper(view, point))

/** Cuts shapes to the view's clip and marks them as its own. Text is placed by hand and only marked. */
export function clipToView(view: View, shapes: readonly Shape[]): Shape[] {
  return shapes.flatMap((shape): Shape[] => {
    if (shape.kind === 'text') return [{ ...shape, view: view.key }]
    if (shape.kind === 'polyline') {
      const lines = shape.lines.flatMap((line) => clipPolyline(line, view.clip))
      return lines.length > 0 ? [{ ...shape, lines, view: view.key }] : []
    }
    const rings = shape.rings.map((ring) => clipPolygon(ring, view.clip)).filter((ring) => ring.length > 2)
    return rings.length > 0 ? [{ ...shape, rings, view: view.key }] : []
  })
}
