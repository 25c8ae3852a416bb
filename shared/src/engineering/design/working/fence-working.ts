import type { Ask } from '../ask.js'
import type { WorkingFigure } from '../working-figure.js'
import { figure, type PartWorking } from './figure.js'

export const fenceWorking: PartWorking = (ask) => [...runWorking(ask), ...energizerWorking(ask)]

function runWorking({ partIfReady }: Ask): WorkingFigure[] {
  const fence = partIfReady('fence')
  if (!fence) return []
  return fence.runs.map((run, index) =>
    figure(
      {
        key: `fence-run-${index + 1}`,
        part: 'fence',
        label: `Fence, ${run.name}`,
        formula: 'length of the run − gates',
        result: run.fencedLengthFt,
        unit: 'ft',
        source: 'geometry',
      },
      [
        ['length', run.lengthFt, 'ft'],
        ['gates', run.gates, ''],
        ['corners', run.corners, ''],
        ['line posts', run.linePosts, ''],
      ],
    ),
  )
}

function energizerWorking({ partIfReady, input }: Ask): WorkingFigure[] {
  const energizer = partIfReady('fence')?.energizer
  if (!energizer || !input.fence) return []
  const byFence = input.fence.energizerRule === 'fence-mile'
  return [
    figure(
      {
        key: 'energizer',
        part: 'fence',
        label: 'Output of the energizer',
        formula: `(miles of ${byFence ? 'fence' : 'hot wire'} + existing miles) · 1 joule`,
        result: energizer.neededJoules,
        unit: 'J',
        source: byFence
          ? 'Gerrish, Common Fencing Mistakes, Beef Magazine'
          : 'University of Maine Extension, Electric Fence Design',
      },
      [
        ['miles', byFence ? energizer.fenceMiles : energizer.hotWireMiles, 'mi'],
        ['existing', energizer.existingMiles, 'mi'],
      ],
    ),
    figure(
      {
        key: 'ground-rods',
        part: 'fence',
        label: 'Ground rod in all',
        formula: 'the greater of 3 ft a joule and the least number of rods',
        result: energizer.rodFt,
        unit: 'ft',
        source: 'NRCS Virginia electric fence job sheet 382, June 2009; least number: district setting',
      },
      [
        ['joules', energizer.sizeJoules ?? energizer.neededJoules, 'J'],
        ['by the rule', energizer.rodFtByRule, 'ft'],
        ['rods', energizer.rods, ''],
      ],
    ),
  ]
}
