import type { Ask } from '../ask.js'
import type { WorkingFigure } from '../working-figure.js'
import { figure, type PartWorking } from './figure.js'

const exact = 'FHWA, HEC-22, 4th ed., February 2024, eq. 10.12 (prismoidal); exact between sections here'

export const earthworkWorking: PartWorking = (ask) => [...formationWorking(ask), ...volumeWorking(ask)]

const shown = (
  key: string,
  label: string,
  formula: string,
  [result, unit]: readonly [number, string],
  source: string,
) => ({ key, part: 'earthwork' as const, label, formula, result, unit, source })

function formationWorking({ partIfReady, input }: Ask): WorkingFigure[] {
  const earthwork = partIfReady('earthwork')
  const profile = partIfReady('profile')
  if (!earthwork || !profile || !input.ramp || !input.rock || !input.earthwork) return []
  const { formationWidthFt, verticalRockThicknessFt } = earthwork
  const thicknessFt = input.rock.layers.reduce((sum, { thicknessIn }) => sum + thicknessIn, 0) / 12
  const width = 'width + 2 · edge · rock + 2 · allowance'
  return [
    figure(
      shown(
        'formation-width',
        'Width of the formation',
        width,
        [formationWidthFt, 'ft'],
        'common practice, no source',
      ),
      [
        ['width', input.ramp.widthFt, 'ft'],
        ['edge', input.rock.edgeRunPerRise, 'run per rise'],
        ['rock', thicknessFt, 'ft'],
        ['allowance', input.earthwork.edgeAllowanceFt, 'ft'],
      ],
    ),
    figure(
      shown(
        'rock-plumb',
        'Rock measured plumb',
        'rock / cos of the grade',
        [verticalRockThicknessFt, 'ft'],
        'geometry',
      ),
      [
        ['rock', thicknessFt, 'ft'],
        ['cos', profile.cosTheta, ''],
      ],
    ),
  ]
}

function volumeWorking({ partIfReady, input }: Ask): WorkingFigure[] {
  const earthwork = partIfReady('earthwork')
  if (!earthwork) return []
  const { total, balance } = earthwork
  const { prismoidal, averageEndArea } = total
  const sum = 'sum of (A1 + 4·Am + A2) · L / 6 / 27'
  const dry = [balance.dryCutBankYd3, 'yd³'] as const
  const wet = [balance.wetCutBankYd3, 'yd³'] as const
  const fill = [balance.compactedNeededYd3, 'yd³'] as const
  const spoil = [balance.spoilLooseYd3, 'yd³'] as const
  return [
    figure(shown('dry-cut', 'Dry cut, with the pad', `${sum}, and the pad`, dry, exact), [
      ['ramp and its ends', prismoidal.dryCutYd3, 'yd³'],
      ['the same by average end area', averageEndArea.dryCutYd3, 'yd³'],
    ]),
    figure(shown('wet-cut', 'Cut under water', `${sum}, below today’s water`, wet, exact), [
      ['water today', input.site?.waterSurfaceTodayFt, 'ft'],
      ['the same by average end area', averageEndArea.wetCutYd3, 'yd³'],
    ]),
    figure(shown('earth-fill', 'Fill and edge backfill', 'fill + edge backfill, compacted', fill, exact), [
      ['fill', prismoidal.fillYd3, 'yd³'],
      ['edge backfill', prismoidal.edgeBackfillYd3, 'yd³'],
    ]),
    figure(
      shown('spoil-loose', 'Wet spoil, loose', 'wet cut · (1 + swell)', spoil, 'swell: district setting'),
      [
        ['wet cut', balance.wetCutBankYd3, 'yd³'],
        ['swell', balance.swellPercent, '%'],
      ],
    ),
  ]
}
