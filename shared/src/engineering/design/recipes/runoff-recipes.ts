import { bermDesign } from '../../berm/berm-design.js'
import { designPeak } from '../../runoff/design-peak.js'
import type { BermSide } from '../../berm/berm-design-types.js'
import type { Recipe } from './recipe.js'

export const runoffRecipe: Recipe<'runoff'> = (ask) => {
  const { rational, flowLengthFt, landSlopePercent, curveNumber, ...rest } = ask.plan('runoff')
  const methods = designPeak({
    ...rest,
    curveNumber,
    methods: rational ? ['graphical', 'rational'] : ['graphical'],
    timeOfConcentration: { method: 'lag', flowLengthFt, curveNumber, landSlopePercent },
    ...(rational ? { rational } : {}),
  })
  const { graphical, rational: byIntensity, designPeakCfs, governs, notes } = methods
  return {
    runoffDepthIn: graphical && 'peakCfs' in graphical ? graphical.runoffDepthIn : 0,
    timeOfConcentrationHr: methods.timeOfConcentration.timeOfConcentrationHr,
    graphicalPeakCfs: peakOf(graphical),
    rationalPeakCfs: peakOf(byIntensity),
    designPeakCfs,
    governs,
    notes,
    methods,
  }
}

const peakOf = (result: { peakCfs: number } | { refused: string } | undefined): number | null =>
  result && 'peakCfs' in result ? result.peakCfs : null

export const bermRecipe: Recipe<'berm'> = (ask) => {
  const plan = ask.plan('berm')
  const sides: readonly BermSide[] = plan.falls === 'both' ? ['left', 'right'] : [plan.falls]
  return bermDesign({
    ...plan,
    flowCfs: ask.part('runoff').designPeakCfs,
    resistanceHigh: { roughness: plan.roughnessHigh },
    resistanceLow: { roughness: plan.roughnessLow },
    freeboardFt: ask.setting('bermFreeboardFt'),
    settlementPercent: ask.setting('bermSettlementPercent'),
    shrinkPercent: ask.setting('shrinkPercent'),
    rampWidthFt: ask.plan('ramp').widthFt,
    // The plan measures what the berm reaches past from the ramp's own edge; the check takes the side slopes off.
    rampEdgeCutFt: 0,
    pastEdgeFt: { left: plan.pastLeftFt, right: plan.pastRightFt },
    outlets: sides.map((side) => ({
      side,
      surface: plan.outletSurface,
      distanceToRampFt: plan.outletToRampFt,
      stable: plan.outletIsStable,
    })),
  })
}
