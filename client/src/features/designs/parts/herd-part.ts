import { animalChoices } from '../choice-words'
import { number, select } from '../field-specs'
import type { PartSpec } from '../part-spec'

export const herdPart: PartSpec = {
  part: 'herd',
  title: 'Herd',
  sentence: 'Who drinks here. It sets the width of the ramp and the water needed in a day.',
  items: [
    number('headCount', 'Head in all', 'head'),
    number('shareAtOncePercent', 'Share that drinks at once', '%'),
    number('frontageFtPerHead', 'Frontage for one animal', 'ft'),
    {
      kind: 'list',
      name: 'classes',
      title: 'Classes of stock',
      one: 'class',
      hint: 'For the water needed in a day. Heat is the design temperature of the day.',
      empty: {},
      items: [
        select('kind', 'Kind', animalChoices),
        number('head', 'Head', 'head'),
        number('weightLb', 'Weight', 'lb', { isOptional: true }),
        number('milkLb', 'Milk a day', 'lb', { isOptional: true }),
        number('temperatureF', 'Heat', '°F'),
        number('perHeadGal', 'Water for one head', 'gal a day', {
          isOptional: true,
          hint: 'In place of the published table',
        }),
      ],
    },
  ],
  start: () => ({ classes: [{}] }),
  results: ['herd'],
}
