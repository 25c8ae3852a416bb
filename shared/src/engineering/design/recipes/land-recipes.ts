import { daysOfSupply } from '../../pond/days-of-supply.js'
import { pondStorage } from '../../pond/pond-storage.js'
import { seedingPlan } from '../../seeding/seeding-plan.js'
import { sideSlopeAreaFt2 } from '../side-slope-area-ft2.js'
import type { Recipe } from './recipe.js'

export const pondRecipe: Recipe<'pond'> = (ask) => {
  const plan = ask.planIfAny('pond')
  if (plan === undefined) return null
  const { body, waterSurfaceTodayFt } = ask.plan('site')
  // Running water is not stored; the areas stay in the plan, should the kind of water have been chosen wrongly.
  if (body === 'stream' || body === 'river') return null
  const { fullPoolElevationFt, toeElevationFt, drinkingDepthAtLowWaterFt } = ask.part('profile')
  const toElevationFt = toeElevationFt + drinkingDepthAtLowWaterFt
  const { dailyWater } = ask.part('herd')
  const fallingFrom = (fromElevationFt: number) =>
    daysOfSupply({ ...plan, fromElevationFt, toElevationFt, dailyWaterGal: dailyWater.totalGal })
  const full = fallingFrom(fullPoolElevationFt)
  return {
    storage: pondStorage(plan),
    fromElevationFt: fullPoolElevationFt,
    toElevationFt,
    usableFt3: full.usableFt3,
    usePerDayFt3: full.usePerDayFt3,
    daysOfSupply: full.days,
    // Water above full pool runs off through the spillway, so it is no supply.
    daysFromToday: fallingFrom(Math.min(waterSurfaceTodayFt, fullPoolElevationFt)).days,
    steps: full.steps,
  }
}

export const seedingRecipe: Recipe<'seeding'> = (ask) => {
  const { extraDisturbedAreaFt2, mix, mulchTonsPerAcre } = ask.plan('seeding')
  const sideSlopesFt2 = sideSlopeAreaFt2({
    ...ask.plan('earthwork'),
    earthwork: ask.part('earthwork'),
    waterSurfaceFt: ask.plan('site').waterSurfaceTodayFt,
  })
  const disturbedAreaFt2 = extraDisturbedAreaFt2 + ask.part('berm').footprintFt2 + sideSlopesFt2
  return { ...seedingPlan({ disturbedAreaFt2, mix, mulchTonsPerAcre }), sideSlopesFt2 }
}
