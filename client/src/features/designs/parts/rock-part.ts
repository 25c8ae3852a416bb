import { layerChoices } from '../choice-words'
import { number, select, text } from '../field-specs'
import type { PartSpec } from '../part-spec'

export const rockPart: PartSpec = {
  part: 'rock',
  title: 'Rock',
  sentence: 'The layers of stone from the top down, and how the edge of the rock slopes.',
  items: [
    number('edgeRunPerRise', 'Slope of the edge', ': 1', { hint: '0 is a plumb edge' }),
    {
      kind: 'list',
      name: 'layers',
      title: 'Layers, from the top down',
      one: 'layer',
      empty: { role: 'base' },
      isOrdered: true,
      items: [
        select('role', 'Use', layerChoices),
        text('name', 'Name', { hint: 'As the quarry calls it' }),
        number('stoneSizeIn', 'Size of stone', 'in'),
        number('thicknessIn', 'Thickness', 'in'),
        number('unitWeightTonsPerYd3', 'Unit weight in place', 'tons/yd³', { hint: 'From the quarry' }),
        number('wastePercent', 'Waste', '%'),
        number('truckTons', 'Load of a truck', 'tons', { isOptional: true }),
      ],
    },
  ],
  start: () => ({ layers: [{ role: 'surface' }, { role: 'base' }] }),
  results: ['rock'],
}
