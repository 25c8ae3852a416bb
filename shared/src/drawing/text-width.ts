import { fontAdvances } from './font-advances.js'
import type { Weight } from './shapes.js'

const tableOf = (rows: readonly (readonly [number, string])[]) =>
  new Map(rows.flatMap(([width, signs]) => [...signs].map((sign) => [sign, width] as const)))

const tables = { regular: tableOf(fontAdvances.regular), bold: tableOf(fontAdvances.bold) }

/** A sign outside the table is taken as wide as the widest letter, so that room is never short. */
const WIDEST = 950

export interface TextMeasure {
  text: string
  sizeMm: number
  weight: Weight
}

/** Width of one line of text in millimetres, without kerning, which only ever draws letters closer. */
export function textWidthMm({ text, sizeMm, weight }: TextMeasure): number {
  const thousandths = [...text].reduce((sum, sign) => sum + (tables[weight].get(sign) ?? WIDEST), 0)
  return (thousandths / 1000) * sizeMm
}

/** The largest of the sizes at which the text fits, or the smallest when none does. */
export function fittingSizeMm(
  measure: Omit<TextMeasure, 'sizeMm'> & { sizesMm: readonly number[]; widthMm: number },
): number {
  const fits = (sizeMm: number) => textWidthMm({ ...measure, sizeMm }) <= measure.widthMm
  return measure.sizesMm.find(fits) ?? Math.min(...measure.sizesMm)
}

/** Breaks text into lines that fit; a word longer than a line is broken inside. */
export function wrapText(measure: TextMeasure & { widthMm: number }): string[] {
  const { widthMm, sizeMm, weight } = measure
  const fits = (text: string) => textWidthMm({ text, sizeMm, weight }) <= widthMm
  const pieces = measure.text.split(' ').flatMap((word) => splitLongWord(word, fits))
  return pieces.reduce<string[]>((lines, piece) => {
    const last = lines.at(-1)
    if (last !== undefined && fits(`${last} ${piece}`)) return [...lines.slice(0, -1), `${last} ${piece}`]
    return [...lines, piece]
  }, [])
}

function splitLongWord(word: string, fits: (text: string) => boolean): string[] {
  if (fits(word)) return [word]
  const parts: string[] = []
  for (const sign of word) {
    const last = parts.at(-1)
    if (last !== undefined && fits(last + sign)) parts[parts.length - 1] = last + sign
    else parts.push(sign)
  }
  return parts
}
