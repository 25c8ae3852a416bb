import type { DesignPartName } from './design-parts.js'

/** Where the inputs of a part stand in the plan, unless a field is listed below. */
const planOf: Record<DesignPartName, string> = {
  herd: 'herd',
  profile: 'ramp',
  earthwork: 'earthwork',
  rock: 'rock',
  fabric: 'fabric',
  approachPad: 'pads.approach',
  closingPanel: 'closingPanel',
  fence: 'fence',
  runoff: 'runoff',
  berm: 'berm',
  pond: 'pond',
  seeding: 'seeding',
}

/** Inputs of a formula that people enter in another place than the part's own. */
const enteredElsewhere: { readonly [field: string]: string } = {
  groundLine: 'site.groundLine',
  fullPoolElevationFt: 'site.fullPoolElevationFt',
  lowWaterElevationFt: 'site.lowWaterElevationFt',
  drawdownFt: 'site.drawdownFt',
  waterSurfaceTodayFt: 'site.waterSurfaceTodayFt',
  floodPoolElevationFt: 'site.floodPoolElevationFt',
  topOfDamElevationFt: 'site.topOfDamElevationFt',
  approachGradeRunPerRise: 'settings.approachGradeRunPerRise',
  swellPercent: 'settings.swellPercent',
  shrinkPercent: 'settings.shrinkPercent',
  spreadDepthIn: 'settings.spoilSpreadDepthIn',
  freeboardFt: 'settings.bermFreeboardFt',
  settlementPercent: 'settings.bermSettlementPercent',
  floatBeyondDepthFt: 'settings.depthAtClosingPanelMaxFt',
  rampWidthFt: 'ramp.widthFt',
  'pastEdgeFt.left': 'berm.pastLeftFt',
  'pastEdgeFt.right': 'berm.pastRightFt',
  resistanceHigh: 'berm.roughnessHigh',
  resistanceLow: 'berm.roughnessLow',
  shareAtOnce: 'herd.shareAtOncePercent',
  rockThicknessIn: 'rock.layers',
  wetLengthFt: 'site.waterSurfaceTodayFt',
}

/** The same where the name alone does not say it: inputs that belong to another part than the formula. */
const enteredElsewhereByPart: { readonly [part: string]: { readonly [field: string]: string } } = {
  earthwork: { widthFt: 'ramp.widthFt', edgeRunPerRise: 'rock.edgeRunPerRise' },
  rock: { widthFt: 'ramp.widthFt' },
  pond: { dailyWaterGal: 'herd.classes' },
  seeding: { disturbedAreaFt2: 'seeding.extraDisturbedAreaFt2' },
  closingPanel: { widthFt: 'ramp.widthFt' },
}

/** Path in the plan of the input that a formula complained about, so that the form can put the sentence there. */
export function fieldPath(part: DesignPartName, field: string): string {
  const [root = field] = field.split(/[[.]/)
  const rest = field.slice(root.length)
  const whole = enteredElsewhereByPart[part]?.[field] ?? enteredElsewhere[field]
  if (whole !== undefined) return whole
  const moved = enteredElsewhere[root]
  return moved === undefined ? `${planOf[part]}.${field}` : `${moved}${moved.endsWith(root) ? rest : ''}`
}
