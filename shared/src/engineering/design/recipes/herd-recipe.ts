import { dailyWaterGal } from '../../herd/daily-water-gal.js'
import { drinkingAtOnce } from '../../herd/drinking-at-once.js'
import { rampWidthFt } from '../../herd/ramp-width-ft.js'
import type { Recipe } from './recipe.js'

export const herdRecipe: Recipe<'herd'> = (ask) => {
  const { headCount, shareAtOncePercent, frontageFtPerHead, classes } = ask.plan('herd')
  const atOnce = drinkingAtOnce({ headCount, shareAtOnce: shareAtOncePercent / 100 })
  return {
    headCount,
    rampWidthFt: rampWidthFt({ headCount }),
    drinkingAtOnce: atOnce,
    frontageNeededFt: atOnce * frontageFtPerHead,
    dailyWater: dailyWaterGal({ classes }),
  }
}
