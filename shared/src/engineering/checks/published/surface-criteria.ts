import type { Criterion } from '../../../schemas/criteria.js'
import { criterion, districtCriterion } from './criterion.js'
import { sources } from './sources.js'

/** Heavy use area protection and critical area planting: slopes, rock, fabric, disturbed ground. */
export const surfaceCriteria: Criterion[] = [
  ...(['cut', 'fill'] as const).map((side) =>
    criterion(`${side}-side`, '561', {
      title: `Side slope in ${side}`,
      comparison: 'at-least',
      limit: 3,
      unit: 'run per rise',
      whenMissed: 'caution',
      source: `${sources.limitedAccess}: 3 : 1 where the site allows`,
    }),
  ),
  criterion('rock-thickness-on-fabric', '561', {
    title: 'Rock on fabric',
    comparison: 'at-least',
    limit: 6,
    unit: 'in',
    whenMissed: 'fail',
    source: sources.alabama,
  }),
  districtCriterion('rock-thickness-common', '561', {
    title: 'Rock on a soft bank',
    comparison: 'at-least',
    setting: 'rockThicknessCautionIn',
    unit: 'in',
    whenMissed: 'caution',
    source: 'district setting; 12 in is common practice',
  }),
  criterion('surface-stone', '561', {
    title: 'Stone that cattle walk on',
    comparison: 'between',
    limit: [1.5, 2],
    unit: 'in',
    whenMissed: 'caution',
    source: `${sources.limitedAccess}: 2 in; Boyles, Ohio State University Extension, 18 May 2011: 1.5 in`,
  }),
  criterion('fabric-strength', '561', {
    title: 'Grab strength of the fabric',
    comparison: 'at-least',
    limit: 180,
    unit: 'lb',
    whenMissed: 'fail',
    source: sources.georgia,
  }),
  criterion('lap-dry', '561', {
    title: 'Lap of the fabric, dry',
    comparison: 'at-least',
    limit: 1.5,
    unit: 'ft',
    whenMissed: 'fail',
    source: `${sources.crossingSpec}; 24 in: heavy use areas sheet, Tennessee, November 2001`,
  }),
  criterion('lap-wet', '561', {
    title: 'Lap of the fabric, under water',
    comparison: 'at-least',
    limit: 3,
    unit: 'ft',
    whenMissed: 'caution',
    source: sources.riprapSpec,
  }),
  criterion('pad-drainage', '561', {
    title: 'Pad falls away from the ramp',
    comparison: 'yes',
    limit: null,
    unit: '',
    whenMissed: 'caution',
    source: `${sources.hardenedSurface}: 3/4 to 1 in a foot`,
    note: 'the pad must not drain down the rock',
  }),
  criterion('disturbed-area', '342', {
    title: 'Disturbed ground',
    comparison: 'at-most',
    limit: 1,
    unit: 'acre',
    whenMissed: 'caution',
    source: sources.stormwater,
    note: 'from one acre on, ask about a storm-water permit',
  }),
]
