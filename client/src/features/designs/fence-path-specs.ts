import { number, text } from './field-specs'
import type { ListSpec, PartItem } from './part-spec'

/** The two ways to say where a run of fence goes. */
export const pointsSpec: ListSpec = {
  kind: 'list',
  name: 'points',
  title: 'Points in plan',
  one: 'point',
  hint: 'In order along the run. East and north from the middle of the ramp at station 0+00.',
  empty: {},
  isOrdered: true,
  isCompact: true,
  items: [number('eastFt', 'East', 'ft'), number('northFt', 'North', 'ft')],
}

export const lengthSpecs: readonly PartItem[] = [
  number('lengthFt', 'Length', 'ft'),
  text('startsAt', 'Label of its start', { isOptional: true, hint: 'The same label is the same post' }),
  text('endsAt', 'Label of its end', { isOptional: true }),
]
