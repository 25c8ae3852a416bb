import { fenceRecipe } from './fence-recipe.js'
import { herdRecipe } from './herd-recipe.js'
import { pondRecipe, seedingRecipe } from './land-recipes.js'
import { closingPanelRecipe, earthworkRecipe, profileRecipe } from './ramp-recipes.js'
import type { Recipes } from './recipe.js'
import { bermRecipe, runoffRecipe } from './runoff-recipes.js'
import { approachPadRecipe, fabricRecipe, rockRecipe } from './surface-recipes.js'

export const recipes: Recipes = {
  herd: herdRecipe,
  profile: profileRecipe,
  earthwork: earthworkRecipe,
  rock: rockRecipe,
  fabric: fabricRecipe,
  approachPad: approachPadRecipe,
  closingPanel: closingPanelRecipe,
  fence: fenceRecipe,
  runoff: runoffRecipe,
  berm: bermRecipe,
  pond: pondRecipe,
  seeding: seedingRecipe,
}
