import type { Criterion } from '../../../schemas/criteria.js'
import { criterion, districtCriterion } from './criterion.js'
import { sources } from './sources.js'

/** Fence and access control. */
export const fenceCriteria: Criterion[] = [
  criterion('setback', '382', {
    title: 'Fence from the water',
    comparison: 'at-least',
    limit: 12,
    unit: 'ft',
    whenMissed: 'fail',
    source: sources.noble,
  }),
  criterion('energized-in-water', '382', {
    title: 'No energized wire in the water',
    comparison: 'yes',
    limit: null,
    unit: '',
    whenMissed: 'fail',
    source: sources.districtSafety,
    confidence: 'district-setting',
  }),
  criterion('fence-in-flood', '382', {
    title: 'No energized wire inside the water at full pool',
    comparison: 'yes',
    limit: null,
    unit: '',
    whenMissed: 'fail',
    source: sources.districtSafety,
    confidence: 'district-setting',
  }),
  criterion('electric-and-barbed', '382', {
    title: 'No energized barbed wire',
    comparison: 'yes',
    limit: null,
    unit: '',
    whenMissed: 'fail',
    source: `${sources.practice}; verify locally`,
    confidence: 'common-practice',
  }),
  criterion('fence-closes', '382', {
    title: 'Fence, lane and panel close the ring',
    comparison: 'yes',
    limit: null,
    unit: '',
    whenMissed: 'fail',
    source: sources.geometry,
    confidence: 'geometry',
  }),
  criterion('ground-rods', '382', {
    title: 'Ground rod in all',
    comparison: 'at-least',
    limit: null,
    unit: 'ft',
    whenMissed: 'fail',
    source: `${sources.virginiaRods}: 3 ft a joule, rods 10 ft apart`,
  }),
  districtCriterion('depth-at-closing-panel', '382', {
    title: 'Water at the closing panel at full pool',
    comparison: 'at-most',
    setting: 'depthAtClosingPanelMaxFt',
    unit: 'ft',
    whenMissed: 'caution',
    source: `district setting; ${sources.kerr}: float where the water is 5 ft deep`,
  }),
  districtCriterion('gate-width', '382', {
    title: 'Narrowest gate',
    comparison: 'at-least',
    setting: 'gateWidthMinFt',
    unit: 'ft',
    whenMissed: 'caution',
  }),
  districtCriterion('habitat-area', '472', {
    title: 'Ground set aside around the water',
    comparison: 'at-least',
    setting: 'habitatAreaMinAcres',
    unit: 'acre',
    whenMissed: 'caution',
  }),
]
