import { feetAndInches } from '../../format/feet-and-inches.js'
import { numberText } from '../../format/number-text.js'
import { labelRoom } from '../label-room.js'
import { northArrow } from '../marks/north-arrow.js'
import { placeNames } from '../marks/place-names.js'
import { scaleBar } from '../marks/scale-bar.js'
import type { SheetTitle } from '../marks/title-block.js'
import { paper, typeMm } from '../pens.js'
import { planAxis, type PlanAxis } from '../plan/plan-axis.js'
import { planFence, planWater } from '../plan/plan-fence.js'
import { fenceWords, stationTicks, workNames } from '../plan/plan-labels.js'
import { wholeView, worksView } from '../plan/plan-view.js'
import { bermArrows, centerLine, planWorks, solidRings } from '../plan/plan-works.js'
import { textAt } from '../shape-makers.js'
import type { SheetModel } from '../sheet-model.js'
import type { Box, Shape, Sheet, View } from '../shapes.js'
import { wrapText } from '../text-width.js'
import { boundsOf, insetBox } from '../geometry/boxes.js'
import { clipToView, lineToPaper } from '../view.js'
import { sheetBorder, sheetFrame, sheetRoom, viewHeading } from './sheet-frame.js'

const TOP_MM = 21
const WHOLE_MM = 122
const GAP_MM = 6
const LIST_MM = 27

/** Where everything lies: the access large, the whole enclosure beside it. North is up. */
export function planSheet(model: SheetModel, title: SheetTitle): Sheet {
  const axis = planAxis(model)
  const right: Box = {
    ...sheetRoom,
    left: sheetRoom.right - WHOLE_MM,
    top: TOP_MM,
    bottom: sheetRoom.bottom - LIST_MM,
  }
  const whole = wholeView(model, right)
  const left: Box = { ...sheetRoom, top: TOP_MM, right: whole ? right.left - GAP_MM : sheetRoom.right }
  const works = worksView(model, axis, left)
  return {
    key: 'plan',
    title: 'Plan',
    widthMm: paper.widthMm,
    heightMm: paper.heightMm,
    border: sheetBorder,
    views: whole ? [works, whole] : [works],
    shapes: [
      ...worksShapes(model, axis, works),
      ...(whole ? wholeShapes(model, axis, whole) : []),
      ...notes(model, axis, right),
      ...sheetFrame(model, title, ['surface', 'fill', 'water', 'fullPool', 'fence', 'closing']),
    ],
    words: planWords(model, axis),
    table: { columns: ['Fence run', 'What'], rows: fenceWords(model).map((line) => splitOnce(line)) },
  }
}

const splitOnce = (line: string): string[] => {
  const [name = '', ...rest] = line.split(': ')
  return [name, rest.join(': ')]
}

function worksShapes(model: SheetModel, axis: PlanAxis, view: View): Shape[] {
  const room = labelRoom(view.clip)
  const ticks = stationTicks(model, axis, view)
  const north = northArrow({ x: view.clip.right - 6, y: view.clip.bottom - 4 })
  room.take([...ticks, ...north])
  room.takeBox({
    left: view.clip.right - 12,
    right: view.clip.right,
    top: view.clip.bottom - 26,
    bottom: view.clip.bottom,
  })
  solidRings(model, axis).forEach((ring) => room.takeBox(insetBox(boundsOf(lineToPaper(view, ring)), 0.6)))
  const names = placeNames(workNames(model, axis, view), room)
  const drawn = [
    ...planWater(model, axis, view),
    ...planWorks(model, axis, view),
    ...centerLine(model, axis, view),
    ...planFence(model, view),
    ...bermArrows(model, axis, view),
    ...ticks,
    ...names,
    ...north,
  ]
  return [
    ...viewHeading({ x: sheetRoom.left, y: 17 }, view.title, view.scaleNote.replace(', true shape', '')),
    ...scaleBar({ view, right: { x: view.clip.right - 4, y: 16 }, roomMm: 32 }),
    ...clipToView(view, drawn),
  ]
}

function wholeShapes(model: SheetModel, axis: PlanAxis, view: View): Shape[] {
  const drawn = [...planWater(model, axis, view), ...planWorks(model, axis, view), ...planFence(model, view)]
  return [
    ...viewHeading({ x: view.clip.left, y: 17 }, view.title, view.scaleNote.replace(', true shape', '')),
    ...scaleBar({ view, right: { x: view.clip.right - 4, y: view.clip.bottom - 3 }, roomMm: 32 }),
    ...clipToView(view, drawn),
  ]
}

/** The fence list under the enclosure, and where the ramp's place on the map comes from. */
function notes(model: SheetModel, axis: PlanAxis, right: Box): Shape[] {
  const setback = model.fence?.value?.setbackFt
  const lines = [
    ...fenceWords(model),
    ...(setback === undefined ? [] : [`Fence to water's edge: at least ${numberText(setback, 1)} ft.`]),
    axis.isKnown
      ? 'East and north in feet from a local origin. Gates are placed on site.'
      : 'No line on the map shows where the ramp lies: it is drawn running south. Set it out from the profile.',
  ]
  const sizeMm = typeMm.small
  const wrapped = lines.flatMap((text) =>
    wrapText({ text, sizeMm, weight: 'regular', widthMm: right.right - right.left }),
  )
  return wrapped
    .slice(0, 6)
    .map((text, index) => textAt(text, { x: right.left, y: right.bottom + 5 + index * 4.1 }, { sizeMm }))
}

function planWords(model: SheetModel, axis: PlanAxis): string[] {
  const { berm, pad, ramp, profile } = model
  const falls = { left: 'to the left', right: 'to the right', both: 'to both sides' }
  return [
    `The ramp is ${feetAndInches(ramp.widthFt)} wide and ${feetAndInches(profile.runFt)} long on the map.`,
    ...(pad ? [`The pad above it is ${feetAndInches(pad.lengthFt)} by ${feetAndInches(pad.widthFt)}.`] : []),
    ...(berm
      ? [
          `The berm is ${numberText(berm.value.lengthFt, 1)} ft long; its channel falls ${falls[berm.plan.falls]}, looking at the water, to ${berm.plan.outletSurface}.`,
        ]
      : []),
    ...fenceWords(model).map((line) => `Fence ${line}.`),
    axis.isKnown ? 'North is up.' : 'Where the ramp lies on the map is not known yet.',
  ]
}
