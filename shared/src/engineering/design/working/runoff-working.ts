import type { Ask } from '../ask.js'
import type { WorkingFigure } from '../working-figure.js'
import { figure, type PartWorking } from './figure.js'

const tr55 = 'USDA NRCS, TR-55, 2nd ed., June 1986'

export const runoffWorking: PartWorking = (ask) => [
  ...timeWorking(ask),
  ...graphicalWorking(ask),
  ...rationalWorking(ask),
]

function timeWorking({ partIfReady, input }: Ask): WorkingFigure[] {
  const runoff = partIfReady('runoff')
  if (!runoff || !input.runoff) return []
  return [
    figure(
      {
        key: 'time-of-concentration',
        part: 'runoff',
        label: 'Time of concentration',
        formula: 'length^0.8 · (S + 1)^0.7 / (1900 · slope^0.5) / 0.6, S = 1000/CN − 10',
        result: runoff.timeOfConcentrationHr,
        unit: 'h',
        source: 'USDA NRCS, National Engineering Handbook, part 630, chapter 15 (lag)',
      },
      [
        ['flow length', input.runoff.flowLengthFt, 'ft'],
        ['curve number', input.runoff.curveNumber, ''],
        ['land slope', input.runoff.landSlopePercent, '%'],
      ],
    ),
  ]
}

function graphicalWorking({ partIfReady, input }: Ask): WorkingFigure[] {
  const graphical = partIfReady('runoff')?.methods.graphical
  if (!graphical || 'refused' in graphical || !input.runoff) return []
  return [
    figure(
      {
        key: 'runoff-depth',
        part: 'runoff',
        label: 'Depth of runoff',
        formula: '(P − Ia)² / (P − Ia + S), Ia = 0.2 · S',
        result: graphical.runoffDepthIn,
        unit: 'in',
        source: `${tr55}, ch. 2`,
      },
      [
        ['rain P', input.runoff.rainfallIn, 'in'],
        ['curve number', input.runoff.curveNumber, ''],
        ['Ia', graphical.initialAbstractionIn, 'in'],
      ],
    ),
    figure(
      {
        key: 'graphical-peak',
        part: 'runoff',
        label: 'Peak flow, graphical method',
        formula: 'unit peak · area · runoff · pond factor',
        result: graphical.peakCfs,
        unit: 'cfs',
        source: `${tr55}, ch. 4 and appendix F`,
      },
      [
        ['unit peak', graphical.unitPeakCsmPerIn, 'csm/in'],
        ['area', input.runoff.areaAcres / 640, 'mi²'],
        ['runoff', graphical.runoffDepthIn, 'in'],
        ['pond factor', graphical.pondFactor, ''],
      ],
    ),
  ]
}

function rationalWorking({ partIfReady, input }: Ask): WorkingFigure[] {
  const rational = partIfReady('runoff')?.methods.rational
  if (!rational || 'refused' in rational || !input.runoff?.rational) return []
  return [
    figure(
      {
        key: 'rational-peak',
        part: 'runoff',
        label: 'Peak flow, rational method',
        formula: 'C · i · A',
        result: rational.peakCfs,
        unit: 'cfs',
        source: 'FHWA, HEC-22, 4th ed., February 2024, ch. 4',
      },
      [
        ['C', input.runoff.rational.runoffCoefficient, ''],
        ['i', rational.intensityInPerHr, 'in/h'],
        ['A', input.runoff.areaAcres, 'acres'],
      ],
    ),
  ]
}
