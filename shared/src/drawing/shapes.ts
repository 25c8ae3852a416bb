/** Everything a drawing is made of, in millimetres on paper: x to the right, y down, from the sheet's top left. */
export interface Point {
  x: number
  y: number
}

export interface Box {
  left: number
  top: number
  right: number
  bottom: number
}

/** Names of inks, not colours: paper, screen, sun and dark theme each bring their own. */
export const tones = [
  'ink',
  'mute',
  'hairline',
  'paper',
  'water',
  'waterTint',
  'earthTint',
  'earthFill',
  'soil',
  'stone',
  'stoneLight',
  'stoneDark',
  'grass',
  'grassTint',
  'signal',
] as const
export type Tone = (typeof tones)[number]

export interface Stroke {
  tone: Tone
  widthMm: number
  dashMm?: readonly number[]
}

interface ShapeBase {
  /** The view whose clip holds this shape; without one the sheet's border does. */
  view?: string
  /** What the shape stands for, so that tests and screens can find it. */
  id?: string
}

export interface PolylineShape extends ShapeBase {
  kind: 'polyline'
  lines: Point[][]
  stroke: Stroke
}

export interface PolygonShape extends ShapeBase {
  kind: 'polygon'
  rings: Point[][]
  fill?: Tone
  stroke?: Stroke
}

export type Weight = 'regular' | 'bold'
export type Align = 'left' | 'center' | 'right'

export interface TextShape extends ShapeBase {
  kind: 'text'
  text: string
  /** On the baseline, at the left end, the middle or the right end of the text. */
  at: Point
  sizeMm: number
  weight: Weight
  align: Align
  tone: Tone
  /** Counter-clockwise on paper. */
  angleDeg?: number
}

export type Shape = PolylineShape | PolygonShape | TextShape

/** A window on the ground with its own scale. `feet` in the ground's own axes, upward positive. */
export interface View {
  key: string
  title: string
  scaleNote: string
  clip: Box
  horizontalMmPerFt: number
  verticalMmPerFt: number
  exaggeration: number
  /** Where the ground point `origin` lies on paper. */
  originFt: { x: number; y: number }
  originMm: Point
}

export interface SheetTable {
  columns: string[]
  rows: string[][]
}

export interface Sheet {
  key: string
  title: string
  widthMm: number
  heightMm: number
  border: Box
  views: View[]
  shapes: Shape[]
  /** The same figures in words, for those who read rather than look. */
  words: string[]
  table: SheetTable
}
