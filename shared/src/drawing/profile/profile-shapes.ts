import { boundsOf, insetBox } from '../geometry/boxes.js'
import { labelRoom } from '../label-room.js'
import type { SheetModel } from '../sheet-model.js'
import type { Shape, View } from '../shapes.js'
import { clipToView, toPaper } from '../view.js'
import { gradeLabel, profileDimensions } from './profile-dimensions.js'
import { profileGrid } from './profile-grid.js'
import { profileGround, profileLines } from './profile-ground.js'
import { profileLeaders } from './profile-leaders.js'
import { profileLevels } from './profile-levels.js'
import { profilePanel } from './profile-panel.js'
import { profileRock } from './profile-rock.js'

/** The profile as it is inked: masses first, then lines, then marks, with every label where none other stands. */
export function profileShapes(model: SheetModel, view: View): Shape[] {
  const room = labelRoom(view.clip)
  const grid = profileGrid(view)
  const dimensions = profileDimensions(model, view, room)
  const panel = profilePanel(model, view)
  const rails = panel.flatMap((shape) => (shape.kind === 'polyline' ? shape.lines.flat() : []))
  const pool = toPaper(view, { x: 0, y: model.site.fullPoolElevationFt }).y
  if (rails.length > 0) room.takeBox(insetBox({ ...boundsOf(rails), bottom: pool }, 0.8))
  const grade = gradeLabel(model, view, room)
  const levels = profileLevels(model, view, room)
  const leaders = profileLeaders(model, view, room)
  const masses = [
    ...profileGround(model, view),
    ...grid.lines,
    ...profileRock(model, view),
    ...profileLines(model, view),
  ]
  const marks = [...panel, ...levels, ...dimensions, ...grade, ...leaders]
  return [...clipToView(view, [...masses, ...marks]), ...grid.labels]
}
