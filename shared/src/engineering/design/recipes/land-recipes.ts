import { sideSlopeAreaFt2 } from '../side-slope-area-ft2.js'
import type { Recipe } from './recipe.js'

export const pondRecipe: Recipe<'pond'> = () => null

export const seedingRecipe: Recipe<'seeding'> = (ask) => {
  const plan = ask.plan('seeding')
  const sides = ask.plan('earthwork')
  const disturbedAreaFt2 =
    plan.extraDisturbedAreaFt2 +
    ask.part('berm').footprintFt2 +
    sideSlopeAreaFt2({
      ...sides,
      earthwork: ask.part('earthwork'),
      waterSurfaceFt: ask.plan('site').waterSurfaceTodayFt,
    })
  return { disturbedAreaFt2, acres: disturbedAreaFt2 / 43560, mix: [], mulchTons: 0 }
}
