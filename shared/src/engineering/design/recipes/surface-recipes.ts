import { fabricTakeOff } from '../../fabric/fabric-take-off.js'
import { approachPad } from '../../pads/approach-pad.js'
import { rockLayers } from '../../rock/rock-layers.js'
import type { Recipe } from './recipe.js'
import { FT3_PER_YD3 } from '../../unit-factors.js'

export const rockRecipe: Recipe<'rock'> = (ask) => {
  const { layers, edgeRunPerRise } = ask.plan('rock')
  return rockLayers({
    layers,
    edgeRunPerRise,
    widthFt: ask.plan('ramp').widthFt,
    slopeLengthFt: ask.part('profile').rockedLengthFt,
  })
}

export const fabricRecipe: Recipe<'fabric'> = (ask) => {
  const fabric = ask.plan('fabric')
  const { rockedLengthFt, wetSlopeLengthTodayFt = 0 } = ask.part('profile')
  const { formationWidthFt } = ask.part('earthwork')
  return fabricTakeOff({
    ...fabric,
    formationWidthFt,
    slopeLengthFt: rockedLengthFt,
    wetLengthFt: Math.min(wetSlopeLengthTodayFt, rockedLengthFt),
  })
}

export const approachPadRecipe: Recipe<'approachPad'> = (ask) => {
  const plan = ask.planIfAny('pads')?.approach
  if (plan === undefined) return null
  const profile = ask.part('profile')
  const landingLengthFt = ask.plan('ramp').landingLengthFt ?? 0
  const rockFt = ask.plan('rock').layers.reduce((sum, { thicknessIn }) => sum + thicknessIn, 0) / 12
  const fabric = ask.input.fabric
  const pad = approachPad({
    ...plan,
    rampTopStationFt: profile.topStationFt - landingLengthFt,
    // A landing is level, so its rock stands as thick plumb as square.
    rampVerticalRockThicknessFt: landingLengthFt > 0 ? rockFt : rockFt / profile.cosTheta,
    ...(fabric ? { fabric } : {}),
  })
  return {
    lengthFt: plan.lengthFt,
    widthFt: plan.widthFt,
    fromStationFt: pad.fromStationFt,
    toStationFt: pad.toStationFt,
    areaFt2: pad.areaFt2,
    rockVolumeYd3: pad.volumeYd3,
    thickeningVolumeYd3: pad.thickeningFt3 / FT3_PER_YD3,
    tons: pad.tons,
    orderTons: pad.orderTons,
    cutBankYd3: pad.cutYd3,
    stepToRampFormationFt: pad.stepToRampFormationFt,
    fabricAreaFt2: pad.fabric?.netAreaFt2 ?? 0,
  }
}
