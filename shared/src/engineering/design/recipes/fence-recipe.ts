import { fenceTakeOff } from '../../fence/fence-take-off.js'
import type { Recipe } from './recipe.js'

/** Gerrish, Common Fencing Mistakes, Beef Magazine: 1 joule of output a mile. */
const JOULES_PER_MILE = 1
/** NRCS Virginia electric fence job sheet 382, June 2009: 3 ft of rod a joule. */
const ROD_FT_PER_JOULE = 3

export const fenceRecipe: Recipe<'fence'> = (ask) => {
  const { energizerRule, groundRodLengthFt, minimumGroundRods, ...fence } = ask.plan('fence')
  return fenceTakeOff({
    ...fence,
    energizerRule: { basis: energizerRule, joulesPerMile: JOULES_PER_MILE },
    groundRodRule: {
      rodFtPerJoule: ROD_FT_PER_JOULE,
      rodLengthFt: groundRodLengthFt,
      minimumRods: minimumGroundRods,
    },
    waterOutline: ask.input.site?.waterOutline,
  })
}
