import { typeMm } from './pens.js'
import type { Point, PolygonShape, PolylineShape, Stroke, TextShape, Tone } from './shapes.js'

export const polyline = (points: Point[], stroke: Stroke, id?: string): PolylineShape => ({
  kind: 'polyline',
  lines: [points],
  stroke,
  ...(id ? { id } : {}),
})

export const polygon = (ring: Point[], ink: { fill?: Tone; stroke?: Stroke }, id?: string): PolygonShape => ({
  kind: 'polygon',
  rings: [ring],
  ...ink,
  ...(id ? { id } : {}),
})

export const textAt = (
  text: string,
  at: Point,
  rest: Partial<Omit<TextShape, 'kind' | 'text' | 'at'>> = {},
): TextShape => ({
  kind: 'text',
  text,
  at,
  sizeMm: typeMm.text,
  weight: 'regular',
  align: 'left',
  tone: 'ink',
  ...rest,
})
