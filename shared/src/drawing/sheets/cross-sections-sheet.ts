import { feetAndInches } from '../../format/feet-and-inches.js'
import { numberText } from '../../format/number-text.js'
import { scaleBar } from '../marks/scale-bar.js'
import type { SheetTitle } from '../marks/title-block.js'
import { paper, typeMm } from '../pens.js'
import { drawSection } from '../sections/draw-section.js'
import { sectionShape } from '../sections/section-shape.js'
import { sectionStations, sectionTitle, type ChosenSection } from '../sections/section-stations.js'
import { textAt } from '../shape-makers.js'
import type { SheetModel } from '../sheet-model.js'
import type { Box, Shape, Sheet, View } from '../shapes.js'
import { stationLabel } from '../station-label.js'
import { clipToView, makeView, roundScale, type GroundWindow } from '../view.js'
import { sheetBorder, sheetFrame, sheetRoom, viewHeading } from './sheet-frame.js'

const GAP_MM = 7
const TOP_MM = 22
const HEAD_MM = 6
const FOOT_MM = 5
const SIDE_ROOM_FT = 3
/** Room on paper for the dimension above and for earth below, in millimetres. */
const ROOM_MM = { above: 10, below: 5 }

/** Sections across the ramp at the stations that matter, all at one true scale. */
export function crossSectionsSheet(model: SheetModel, title: SheetTitle): Sheet {
  const chosen = sectionStations(model)
  const cells = gridOf(chosen.length)
  const scale = commonScale(model, chosen, cells)
  const drawn = chosen.flatMap((one, index) => {
    const cell = cells[index]
    return cell ? [drawCell(model, { one, cell, scale })] : []
  })
  const first = drawn[0]?.view
  return {
    key: 'cross-sections',
    title: 'Sections across the ramp',
    widthMm: paper.widthMm,
    heightMm: paper.heightMm,
    border: sheetBorder,
    views: drawn.map(({ view }) => view),
    shapes: [
      ...viewHeading(
        { x: sheetRoom.left, y: 17.5 },
        'Sections across the ramp',
        `${first?.scaleNote ?? ''}. Seen from the hill toward the water. Ground taken level across.`,
      ),
      ...(first ? scaleBar({ view: first, right: { x: sheetRoom.right - 4, y: 16.5 }, roomMm: 34 }) : []),
      ...drawn.flatMap(({ shapes }) => shapes),
      ...sheetFrame(model, title, [
        'existing',
        'finished',
        'fabric',
        'earth',
        'fill',
        'water',
        'surface',
        'base',
        'fullPool',
      ]),
    ],
    words: chosen.map((one) => sectionWords(model, one)),
    table: {
      columns: ['Station', 'Ground', 'Finished', 'Bottom of rock', 'Cut ft²', 'Fill ft²', 'Backfill ft²'],
      rows: chosen.map(({ section }) => [
        stationLabel(section.stationFt),
        ...[section.groundFt, section.finishedFt, section.formationFt].map((value) => numberText(value, 2)),
        ...[section.cutAreaFt2, section.fillAreaFt2, section.edgeBackfillAreaFt2].map((value) =>
          numberText(value, 1),
        ),
      ]),
    },
  }
}

function gridOf(count: number): Box[] {
  const columns = count > 3 ? 2 : 1
  const rows = Math.max(1, Math.ceil(count / columns))
  const width = (sheetRoom.right - sheetRoom.left - GAP_MM * (columns - 1)) / columns
  const height = (sheetRoom.bottom - TOP_MM - GAP_MM * (rows - 1)) / rows
  return Array.from({ length: count }, (_, index) => {
    const left = sheetRoom.left + Math.floor(index / rows) * (width + GAP_MM)
    const top = TOP_MM + (index % rows) * (height + GAP_MM)
    return { left, top, right: left + width, bottom: top + height }
  })
}

const clipOf = (cell: Box): Box => ({ ...cell, top: cell.top + HEAD_MM, bottom: cell.bottom - FOOT_MM })

function windowOf(model: SheetModel, { section }: ChosenSection): GroundWindow {
  const half = sectionShape(model, section).halfReach + SIDE_ROOM_FT
  const level = model.site.fullPoolElevationFt
  const high = Math.max(section.groundFt, section.finishedFt, section.finishedFt < level ? level : -Infinity)
  const low = Math.min(section.groundFt, section.formationFt)
  return { from: { x: -half, y: low }, to: { x: half, y: high } }
}

function commonScale(model: SheetModel, chosen: ChosenSection[], cells: Box[]): number {
  const clip = clipOf(cells[0] ?? sheetRoom)
  const room = { ...clip, top: clip.top + ROOM_MM.above, bottom: clip.bottom - ROOM_MM.below }
  const windows = chosen.map((one) => windowOf(model, one))
  const widthFt = Math.max(1, ...windows.map(({ from, to }) => to.x - from.x))
  const heightFt = Math.max(0.5, ...windows.map(({ from, to }) => to.y - from.y))
  return roundScale({ clip: room, widthFt, heightFt })
}

interface Cell {
  one: ChosenSection
  cell: Box
  scale: number
}

function drawCell(model: SheetModel, { one, cell, scale }: Cell): { view: View; shapes: Shape[] } {
  const clip = clipOf(cell)
  const window = windowOf(model, one)
  const key = `section-${stationLabel(one.section.stationFt)}`
  const made = makeView({ key, title: sectionTitle(one), clip, window, scaleFtPerInch: scale })
  const view = {
    ...made,
    originMm: { ...made.originMm, y: made.originMm.y + (ROOM_MM.above - ROOM_MM.below) / 2 },
  }
  const { cutAreaFt2, fillAreaFt2, finishedFt, groundFt } = one.section
  const areas = `cut ${numberText(cutAreaFt2, 1)} ft², fill ${numberText(fillAreaFt2, 1)} ft²`
  const levels = `finished ${numberText(finishedFt, 2)}, ground ${numberText(groundFt, 2)}`
  return {
    view,
    shapes: [
      textAt(sectionTitle(one), { x: cell.left, y: cell.top + 3.6 }, { weight: 'bold', sizeMm: typeMm.text }),
      textAt(areas, { x: cell.right, y: cell.top + 3.6 }, { align: 'right', sizeMm: typeMm.small }),
      ...clipToView(view, drawSection(model, one, view)),
      textAt(
        levels,
        { x: cell.right, y: cell.bottom - 1 },
        { align: 'right', sizeMm: typeMm.small, tone: 'mute' },
      ),
    ],
  }
}

function sectionWords(model: SheetModel, one: ChosenSection): string {
  const { section } = one
  const shape = sectionShape(model, section)
  return `Section at ${sectionTitle(one)}: the rock is ${feetAndInches(model.ramp.widthFt)} wide on top and ${feetAndInches(shape.halfFormation * 2)} at the bottom; finished ${numberText(section.finishedFt, 2)} ft, ground ${numberText(section.groundFt, 2)} ft; cut ${numberText(section.cutAreaFt2, 1)} ft², fill ${numberText(section.fillAreaFt2, 1)} ft².`
}
