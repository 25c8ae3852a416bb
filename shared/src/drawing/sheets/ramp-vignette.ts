import { pens } from '../pens.js'
import { profileGround, profileLines } from '../profile/profile-ground.js'
import { profileRock } from '../profile/profile-rock.js'
import { profileView } from '../profile/profile-view.js'
import { polyline } from '../shape-makers.js'
import type { SheetModel } from '../sheet-model.js'
import type { Box, Shape } from '../shapes.js'
import { clipToView, lineToPaper } from '../view.js'

/** The bank, the berm, the rock and the water at a glance, without a single label: for a cover or a list. */
export function rampVignette(model: SheetModel, clip: Box): Shape[] {
  // No scale is printed here, so the whole surveyed bank may fill the picture exactly.
  const reachFt = (model.ground.at(-1)?.stationFt ?? 0) - (model.ground[0]?.stationFt ?? 0)
  const scaleFtPerInch = (reachFt * 25.4) / (clip.right - clip.left)
  const view = profileView({ model, clip, key: 'vignette', title: '', mostExaggeration: 2, scaleFtPerInch })
  const y = model.site.fullPoolElevationFt
  const to = model.ground.at(-1)?.stationFt ?? model.profile.toeStationFt
  const pool = lineToPaper(view, [
    { x: model.profile.fullPoolEdgeStationFt, y },
    { x: to, y },
  ])
  return clipToView(view, [
    ...profileGround(model, view),
    ...profileRock(model, view),
    ...profileLines(model, view),
    polyline(pool, pens.fullPool),
  ])
}
