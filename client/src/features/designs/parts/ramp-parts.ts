import { number, station } from '../field-specs'
import type { PartSpec } from '../part-spec'

export const rampPart: PartSpec = {
  part: 'ramp',
  title: 'Ramp',
  sentence: 'Width, grade, top and toe of the rock slope down into the water.',
  items: [
    number('widthFt', 'Width', 'ft'),
    number('gradeRunPerRise', 'Grade', ': 1', { hint: 'Feet of run for one foot of rise' }),
    number('topAboveFullPoolFt', 'Top above full pool', 'ft'),
    number('toeBelowFullPoolFt', 'Toe below full pool', 'ft'),
    number('drinkingDepthAtLowWaterFt', 'Drinking depth at low water', 'ft'),
    station('rampTopStationFt', 'Top station', {
      isOptional: true,
      hint: 'Left empty: where the ground first reaches the top',
    }),
    number('apronLengthFt', 'Apron beyond the toe', 'ft', { isOptional: true }),
    number('landingLengthFt', 'Level landing above the top', 'ft', { isOptional: true }),
  ],
  start: () => ({}),
  results: ['profile'],
}

export const earthworkPart: PartSpec = {
  part: 'earthwork',
  title: 'Earthwork',
  sentence: 'Side slopes of cut and fill beside the rock, and how closely the sections stand.',
  items: [
    number('edgeAllowanceFt', 'Working room beside the rock', 'ft', { hint: 'On each side' }),
    number('cutSideRunPerRise', 'Side slope in cut', ': 1'),
    number('fillSideRunPerRise', 'Side slope in fill', ': 1'),
    number('stationIntervalFt', 'Distance between sections', 'ft'),
  ],
  start: () => ({}),
  results: ['earthwork'],
}
