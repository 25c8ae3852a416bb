import { polygon, textAt, type Shape, type TextShape } from 'shared'
import type { PageFrame } from './packet-document.js'
import { textPage, type } from './theme.js'

interface Paper {
  widthMm: number
  heightMm: number
  isSheet: boolean
}

const { sizeMm } = type.furniture
const exampleWords = 'Example data: people, places, prices and funds are invented.'

/** Head and foot of a page: what it belongs to, its number, and that it is only an example where it is one. */
export function pageFurniture(frame: PageFrame, label: string, paper: Paper): TextShape[] {
  const sideMm = paper.isSheet ? 8 : textPage.leftMm
  const right = paper.widthMm - sideMm
  const footY = paper.isSheet ? paper.heightMm - 3.2 : paper.heightMm - 13
  const headY = paper.isSheet ? 5.6 : 15.5
  const whose = paper.isSheet
    ? []
    : [textAt(`${frame.district}  ·  ${frame.jobTitle}`, { x: sideMm, y: headY }, { sizeMm, tone: 'mute' })]
  const job = paper.isSheet
    ? []
    : [
        textAt(
          `Job ${frame.jobNumber}, revision ${frame.revision}`,
          { x: right, y: headY },
          { sizeMm, tone: 'mute', align: 'right' },
        ),
      ]
  const example = frame.isExample
    ? [textAt(exampleWords, { x: sideMm, y: footY }, { sizeMm, weight: 'bold', tone: 'grass' })]
    : []
  return [
    ...whose,
    ...job,
    ...example,
    textAt(label, { x: right, y: footY }, { sizeMm, tone: 'mute', align: 'right' }),
  ]
}

/** A band across the foot, so that a printed example is never taken for a job. */
export function exampleBand(frame: PageFrame, paper: Paper): Shape[] {
  if (!frame.isExample || paper.isSheet) return []
  const top = paper.heightMm - 17
  const box = [
    { x: 0, y: top },
    { x: paper.widthMm, y: top },
    { x: paper.widthMm, y: top + 6 },
    { x: 0, y: top + 6 },
  ]
  return [polygon(box, { fill: 'grassTint' })]
}
