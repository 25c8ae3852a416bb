import { feetAndInches } from '../../format/feet-and-inches.js'
import { numberText } from '../../format/number-text.js'
import { dataBand } from '../marks/data-band.js'
import { scaleBar } from '../marks/scale-bar.js'
import type { SheetTitle } from '../marks/title-block.js'
import { paper, pens } from '../pens.js'
import { gradeText } from '../profile/profile-dimensions.js'
import { profileGround, profileLines } from '../profile/profile-ground.js'
import { profileRock } from '../profile/profile-rock.js'
import { profileShapes } from '../profile/profile-shapes.js'
import { profileStations, stationCells, stationRows } from '../profile/profile-stations.js'
import { profileView } from '../profile/profile-view.js'
import { atSentenceStart, levelNames } from '../level-names.js'
import type { SheetModel } from '../sheet-model.js'
import type { Box, Shape, Sheet, View } from '../shapes.js'
import { polyline } from '../shape-makers.js'
import { clipToView, lineToPaper, toPaper } from '../view.js'
import { sheetBorder, sheetFrame, sheetRoom, viewHeading } from './sheet-frame.js'

const MAIN: Box = { left: sheetRoom.left + 22, top: 22, right: sheetRoom.right - 12, bottom: 108 }
const BAND: Box = { left: MAIN.left, top: MAIN.bottom, right: MAIN.right, bottom: 133 }
const TRUE_SHAPE: Box = { left: MAIN.left, top: 141, right: MAIN.right, bottom: sheetRoom.bottom }

/** Profile on the center line, with its table of stations and the same in true shape below. */
export function profileSheet(model: SheetModel, title: SheetTitle): Sheet {
  const main = profileView({
    model,
    clip: MAIN,
    key: 'profile',
    title: 'Profile on the center line',
    mostExaggeration: 3,
    headroomMm: 20,
  })
  const plain = profileView({
    model,
    clip: TRUE_SHAPE,
    key: 'true-shape',
    title: 'The same in true shape',
    mostExaggeration: 1,
    scaleFtPerInch: Math.round(25.4 / main.horizontalMmPerFt),
  })
  const stations = profileStations(model)
  return {
    key: 'profile',
    title: 'Profile',
    widthMm: paper.widthMm,
    heightMm: paper.heightMm,
    border: sheetBorder,
    views: [main, plain],
    shapes: [
      ...profileHeading(main, model),
      ...profileShapes(model, main),
      ...bandShapes(model, main),
      ...viewHeading({ x: sheetRoom.left, y: 139.5 }, plain.title, plain.scaleNote),
      ...clipToView(plain, [
        ...profileGround(model, plain),
        ...profileRock(model, plain),
        ...profileLines(model, plain),
        ...poolLine(model, plain),
      ]),
      ...sheetFrame(model, title, [
        'existing',
        'finished',
        'fabric',
        'earth',
        'fill',
        'water',
        'surface',
        'base',
        'lowWater',
      ]),
    ],
    words: profileWords(model, main),
    table: { columns: stationRows, rows: stations.map(stationCells) },
  }
}

/** The grade stands here too, level, since along the slope it is hard to search for and to copy. */
const profileHeading = (view: View, { ramp }: SheetModel): Shape[] => [
  ...viewHeading(
    { x: sheetRoom.left, y: 17.5 },
    view.title,
    `${view.scaleNote}. Grade ${gradeText(ramp.gradeRunPerRise)}`,
  ),
  ...scaleBar({ view, right: { x: sheetRoom.right - 4, y: 16.5 } }),
]

function bandShapes(model: SheetModel, view: View): Shape[] {
  const columns = profileStations(model).map((station) => ({
    xMm: toPaper(view, { x: station.stationFt, y: 0 }).x,
    cells: stationCells(station),
  }))
  return dataBand({ box: BAND, names: stationRows, columns, leastGapMm: 18 })
}

function poolLine(model: SheetModel, view: View): Shape[] {
  const y = model.site.fullPoolElevationFt
  const to = model.ground.at(-1)?.stationFt ?? model.profile.toeStationFt
  const line = lineToPaper(view, [
    { x: model.profile.fullPoolEdgeStationFt, y },
    { x: to, y },
  ])
  return [polyline(line, pens.fullPool)]
}

function profileWords(model: SheetModel, view: View): string[] {
  const { profile, ramp, site, pad, berm, closing } = model
  const names = levelNames[site.body]
  return [
    `The ramp is ${feetAndInches(ramp.widthFt)} wide and falls at ${gradeText(ramp.gradeRunPerRise)} from elevation ${numberText(profile.topElevationFt, 2)} ft to ${numberText(profile.toeElevationFt, 2)} ft: ${feetAndInches(profile.runFt)} measured level, ${feetAndInches(profile.slopeLengthFt)} (${numberText(profile.slopeLengthFt, 2)} ft) along the slope.`,
    `${atSentenceStart(names.high)} is ${numberText(site.fullPoolElevationFt, 2)} ft. At ${names.high} ${feetAndInches(profile.wetRunAtFullFt)} of the ramp lies under water, at ${names.low} ${feetAndInches(profile.wetRunAtLowFt)}.`,
    ...model.layers.map(
      (layer) => `${layer.name}: ${numberText(layer.thicknessIn)} in thick, measured square to the slope.`,
    ),
    ...(pad
      ? [
          `A pad ${feetAndInches(pad.lengthFt)} long and ${numberText(pad.thicknessIn)} in thick lies above the ramp.`,
        ]
      : []),
    ...(berm
      ? [
          `A berm crosses the line at ${numberText(berm.plan.crestStationFt, 1)} ft and is built ${feetAndInches(berm.value.builtHeightFt)} high.`,
        ]
      : []),
    ...(closing ? ['A closing panel stands past the toe. It is never energized.'] : []),
    `Vertical exaggeration ${view.exaggeration}×.`,
  ]
}
