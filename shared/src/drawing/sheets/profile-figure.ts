import { profileShapes } from '../profile/profile-shapes.js'
import { profileStations, stationCells, stationRows } from '../profile/profile-stations.js'
import { profileView } from '../profile/profile-view.js'
import type { SheetModel } from '../sheet-model.js'
import type { Sheet } from '../shapes.js'

interface ProfileFigure {
  model: SheetModel
  widthMm: number
  heightMm: number
}

/** Room beside the view for the elevations written at both ends. */
const SIDE_MM = 12

/** The profile alone, for a screen: the same shapes as on the sheet, without border, band and title block. */
export function profileFigure({ model, widthMm, heightMm }: ProfileFigure): Sheet {
  const clip = { left: SIDE_MM, top: 2, right: widthMm - SIDE_MM, bottom: heightMm - 2 }
  const title = 'Profile on the center line'
  const view = profileView({ model, clip, key: 'profile', title, mostExaggeration: 3, headroomMm: 20 })
  return {
    key: 'profile-figure',
    title: `${title}. ${view.scaleNote}`,
    widthMm,
    heightMm,
    border: { left: 0, top: 0, right: widthMm, bottom: heightMm },
    views: [view],
    shapes: profileShapes(model, view),
    words: [],
    table: { columns: stationRows, rows: profileStations(model).map(stationCells) },
  }
}
