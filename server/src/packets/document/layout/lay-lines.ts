import { textAt, wrapText, type Align, type TextShape, type Tone, type Weight } from 'shared'

export interface LineStyle {
  sizeMm: number
  lineMm: number
  weight?: Weight
  tone?: Tone
  align?: Align
}

interface LinesRequest {
  text: string
  style: LineStyle
  /** Left edge and width of the column that the lines must stay in. */
  xMm: number
  widthMm: number
  yMm?: number
}

const startOf = { left: 0, center: 0.5, right: 1 } as const
/** Where the baseline stands inside a line's height. */
const BASELINE = 0.74

/** Text broken into lines that fit their column, each in its place; paragraphs end at line breaks. */
export function layLines({ text, style, xMm, widthMm, yMm = 0 }: LinesRequest): TextShape[] {
  const { sizeMm, lineMm, weight = 'regular', tone = 'ink', align = 'left' } = style
  const lines = text.split('\n').flatMap((part) => wrapText({ text: part, sizeMm, weight, widthMm }))
  return lines.map((line, index) =>
    textAt(
      line,
      { x: xMm + startOf[align] * widthMm, y: yMm + index * lineMm + lineMm * BASELINE },
      { sizeMm, weight, tone, align },
    ),
  )
}

export const linesHeight = (texts: readonly TextShape[], style: LineStyle) => texts.length * style.lineMm
