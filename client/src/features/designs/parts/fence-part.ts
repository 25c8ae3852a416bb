import { energizerChoices, fenceKindChoices, fenceRoleChoices } from '../choice-words'
import { check, number, select, text } from '../field-specs'
import type { PartSpec } from '../part-spec'

const emptyRun = {
  role: 'exclusion',
  path: { points: [{}, {}] },
  fence: 'electric',
  energized: true,
  inWater: false,
  gates: [],
}

export const fencePart: PartSpec = {
  part: 'fence',
  title: 'Fence',
  sentence: 'Every run of fence, by its points in plan or by its length, and what it is built of.',
  items: [
    {
      kind: 'list',
      name: 'runs',
      title: 'Runs',
      one: 'run',
      empty: emptyRun,
      items: [
        text('name', 'Name of the run'),
        select('role', 'What it is for', fenceRoleChoices),
        select('fence', 'Kind of fence', fenceKindChoices),
        number('wires', 'Single wires'),
        number('hotWires', 'Of them hot', undefined, { isOptional: true }),
        text('wireKind', 'Kind of wire', { hint: 'The same word for the same wire' }),
        number('postSpacingFt', 'Distance between posts', 'ft'),
        check('energized', 'Energized'),
        check('inWater', 'Stands in water', { hint: 'No wire that can be under water is energized.' }),
        {
          kind: 'list',
          name: 'gates',
          isCompact: true,
          title: 'Gates',
          one: 'gate',
          empty: {},
          items: [number('widthFt', 'Width', 'ft')],
        },
        { kind: 'fence-path', name: 'path' },
      ],
    },
    {
      kind: 'list',
      name: 'nodes',
      title: 'Places where runs meet',
      one: 'place',
      hint: 'Only those that tie into a post that stands already, by the label given at the end of a run.',
      empty: { existing: true },
      items: [text('label', 'Label'), check('existing', 'The braced post stands already')],
    },
    { kind: 'roll-lengths', name: 'rollLengthFt' },
    number('cornerAngleDeg', 'A turn is a corner from', 'degrees'),
    number('maxPullFt', 'Longest pull', 'ft', { hint: 'Without a brace in the line' }),
    number('tieOffFt', 'Wire for a tie-off', 'ft', { isOptional: true }),
    number('wastePercent', 'Waste of wire', '%'),
    select('energizerRule', 'Size of the energizer', energizerChoices),
    number('existingEnergizedMiles', 'Fence it already feeds', 'miles', { isOptional: true }),
    number('groundRodLengthFt', 'Length of a ground rod', 'ft'),
    number('minimumGroundRods', 'Ground rods at least'),
    number('laneAreaFt2', 'Area of the lane', 'ft²', {
      isOptional: true,
      hint: 'Not counted as set aside for habitat',
    }),
  ],
  start: () => ({ runs: [emptyRun], rollLengthFt: {} }),
  results: ['fence'],
}
