import { closingPanel } from '../../ramp/closing-panel.js'
import { rampEarthwork } from '../../ramp/ramp-earthwork.js'
import { rampProfile } from '../../ramp/ramp-profile.js'
import type { Ask } from '../ask.js'
import { NotReady } from '../not-ready.js'
import type { Recipe } from './recipe.js'

export const profileRecipe: Recipe<'profile'> = (ask) => {
  const site = surveyedSite(ask)
  return rampProfile({
    ...site,
    ...ask.plan('ramp'),
    approachGradeRunPerRise: ask.settingIfEntered('approachGradeRunPerRise'),
  })
}

/** Runs before the pad may be ready, so that a half-typed pad does not take the sections off the screen. */
export const earthworkRecipe: Recipe<'earthwork'> = (ask) => {
  const { groundLine, waterSurfaceTodayFt } = surveyedSite(ask)
  const { layers, edgeRunPerRise } = ask.plan('rock')
  return rampEarthwork({
    ...ask.plan('earthwork'),
    groundLine,
    waterSurfaceTodayFt,
    profile: ask.part('profile'),
    widthFt: ask.plan('ramp').widthFt,
    edgeRunPerRise,
    rockThicknessIn: layers.reduce((sum, { thicknessIn }) => sum + thicknessIn, 0),
    swellPercent: ask.setting('swellPercent'),
    shrinkPercent: ask.setting('shrinkPercent'),
    spreadDepthIn: ask.settingIfEntered('spoilSpreadDepthIn'),
    otherDryCutYd3: ask.partIfReady('approachPad')?.cutBankYd3 ?? 0,
  })
}

export const closingPanelRecipe: Recipe<'closingPanel'> = (ask) => {
  const panel = ask.planIfAny('closingPanel')
  if (panel === undefined) return null
  const { groundLine, waterSurfaceTodayFt } = surveyedSite(ask)
  return closingPanel({
    ...panel,
    groundLine,
    waterSurfaceTodayFt,
    profile: ask.part('profile'),
    widthFt: ask.plan('ramp').widthFt,
    floatBeyondDepthFt: ask.settingIfEntered('depthAtClosingPanelMaxFt'),
  })
}

function surveyedSite(ask: Ask) {
  const site = ask.plan('site')
  if (site.groundLine.length > 0) return site
  const message = 'There is no survey yet. Enter level notes or a ground line first.'
  throw new NotReady({ ok: false, field: 'site.groundLine', message })
}
