import { number, text } from '../field-specs'
import type { PartSpec } from '../part-spec'

export const fabricPart: PartSpec = {
  part: 'fabric',
  title: 'Fabric',
  sentence: 'The fabric under the rock: roll, laps and how its ends are held.',
  items: [
    text('product', 'Product or class', { hint: 'Such as the weight and how it is made' }),
    number('sideTurnUpFt', 'Turned up at each side', 'ft'),
    number('topAnchorFt', 'Anchor at the top', 'ft'),
    number('toeWrapFt', 'Wrap at the toe', 'ft'),
    number('rollWidthFt', 'Width of a roll', 'ft'),
    number('rollLengthFt', 'Length of a roll', 'ft'),
    number('lapDryFt', 'Lap in the dry', 'ft'),
    number('lapWetFt', 'Lap under water', 'ft'),
    number('grabStrengthLb', 'Grab strength', 'lb', { isOptional: true }),
  ],
  start: () => ({}),
  results: ['fabric'],
}

export const padsPart: PartSpec = {
  part: 'pads',
  title: 'Approach pad',
  sentence: 'Rock on the level above the ramp, where stock wait and turn. A job may do without.',
  items: [
    {
      kind: 'group',
      name: 'approach',
      title: 'Approach pad',
      hint: 'Without it the rock begins at the ramp top or the landing.',
      empty: {},
      items: [
        number('lengthFt', 'Length', 'ft'),
        number('widthFt', 'Width', 'ft'),
        number('thicknessIn', 'Thickness', 'in'),
        number('unitWeightTonsPerYd3', 'Unit weight in place', 'tons/yd³', { hint: 'From the quarry' }),
        number('wastePercent', 'Waste', '%'),
        number('thickenAtRampFt', 'Thickened toward the ramp over', 'ft'),
      ],
    },
  ],
  start: () => ({}),
  results: ['approachPad'],
}

export const closingPanelPart: PartSpec = {
  part: 'closingPanel',
  title: 'Closing panel',
  sentence: 'The panel in the water that keeps stock on the ramp. It is never energized.',
  items: [
    number('clearFt', 'Clear of the ramp edge', 'ft', { hint: 'On each side' }),
    number('beyondToeFt', 'Beyond the toe', 'ft'),
    number('aboveWaterFt', 'Above full pool', 'ft'),
    number('postSpacingFt', 'Distance between posts', 'ft'),
  ],
  start: () => ({}),
  results: ['closingPanel'],
}
