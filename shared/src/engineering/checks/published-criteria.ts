import type { Criterion } from '../../schemas/criteria.js'
import { bermCriteria } from './published/berm-criteria.js'
import { fenceCriteria } from './published/fence-criteria.js'
import { rampCriteria } from './published/ramp-criteria.js'
import { surfaceCriteria } from './published/surface-criteria.js'

/**
 * First criteria set of a new district: published limits with their sources, and the checks whose limit the district
 * must enter. A state's own standard can be stricter; the district copies this set, edits it and puts it in force.
 */
export const publishedCriteria: Criterion[] = [
  ...rampCriteria,
  ...surfaceCriteria,
  ...fenceCriteria,
  ...bermCriteria,
]
