import { bodyChoices } from '../choice-words'
import { number, select, text } from '../field-specs'
import type { PartSpec } from '../part-spec'

const level = { isOptional: true }

export const sitePart: PartSpec = {
  part: 'site',
  title: 'Water levels',
  sentence: 'The levels of the water and what lies near. The ground itself comes from the survey.',
  items: [
    select('body', 'Kind of water', bodyChoices),
    number('fullPoolElevationFt', 'Full pool', 'ft'),
    number('lowWaterElevationFt', 'Low water', 'ft', level),
    number('drawdownFt', 'Fall of the water', 'ft', {
      isOptional: true,
      hint: 'Below full pool, where low water itself is not known',
    }),
    number('waterSurfaceTodayFt', 'Water while building', 'ft'),
    number('floodPoolElevationFt', 'Flood pool', 'ft', level),
    number('topOfDamElevationFt', 'Top of dam', 'ft', level),
    number('distanceToDamFt', 'Distance to the dam', 'ft', {
      isOptional: true,
      hint: 'From ramp and lane, in plan',
    }),
    number('distanceToSpillwayFt', 'Distance to the spillway', 'ft', level),
    number('distanceToInflowFt', 'Distance to the inflow', 'ft', level),
    text('soil', 'Soil of the bank', { isOptional: true }),
    {
      kind: 'list',
      name: 'waterOutline',
      title: 'Outline of the water',
      one: 'point',
      hint: 'Three points or more, walked one way round. The middle of the ramp at station 0+00 is 0 east, 0 north.',
      empty: {},
      isCompact: true,
      isOrdered: true,
      items: [number('eastFt', 'East', 'ft'), number('northFt', 'North', 'ft')],
    },
  ],
  start: ({ body, waterSurfaceFt }) => ({ body, waterSurfaceTodayFt: waterSurfaceFt ?? null }),
  results: ['profile'],
}
