import type { Ask } from '../ask.js'
import type { WorkingFigure } from '../working-figure.js'
import { figure, type PartWorking } from './figure.js'

const manning = 'FHWA, HEC-22, 4th ed., February 2024, ch. 6 (Manning, 1.486)'

export const bermWorking: PartWorking = (ask) => [...flowWorking(ask), ...ridgeWorking(ask)]

const shown = (
  key: string,
  label: string,
  formula: string,
  [result, unit]: readonly [number, string],
  source: string,
) => ({ key, part: 'berm' as const, label, formula, result, unit, source })

function flowWorking({ partIfReady, input }: Ask): WorkingFigure[] {
  const berm = partIfReady('berm')
  if (!berm || !input.berm) return []
  const { channelGradeFtPerFt, roughnessHigh, roughnessLow } = input.berm
  const depth = [berm.depthFt, 'ft'] as const
  const velocity = [berm.velocityFtPerS, 'ft/s'] as const
  const formula = 'Q = 1.486/n · A · R^(2/3) · S^(1/2), solved for the depth'
  return [
    figure(shown('berm-depth', 'Depth of flow, roughest', formula, depth, manning), [
      ['Q', berm.armFlowCfs, 'cfs'],
      ['n', roughnessHigh, ''],
      ['S', channelGradeFtPerFt, 'ft/ft'],
    ]),
    figure(
      shown('berm-velocity', 'Velocity, smoothest', 'Q / A at the depth found anew', velocity, manning),
      [
        ['Q', berm.armFlowCfs, 'cfs'],
        ['n', roughnessLow, ''],
        ['depth', berm.lowResistanceDepthFt, 'ft'],
      ],
    ),
  ]
}

function ridgeWorking({ partIfReady, settingIfEntered, input }: Ask): WorkingFigure[] {
  const berm = partIfReady('berm')
  if (!berm || !input.berm) return []
  const greater = 'the greater of depth + freeboard and the least height'
  const crest = [berm.crestAboveChannelFt, 'ft'] as const
  const built = [berm.builtHeightFt, 'ft'] as const
  const earth = [berm.earthCompactedYd3, 'yd³'] as const
  return [
    figure(shown('berm-height', 'Crest above the channel', greater, crest, 'freeboard: district setting'), [
      ['depth', berm.depthFt, 'ft'],
      ['freeboard', settingIfEntered('bermFreeboardFt'), 'ft'],
      ['least height', input.berm.minimumHeightFt, 'ft'],
    ]),
    figure(
      shown(
        'berm-built-height',
        'Height as built, at the middle',
        'settled height · (1 + settlement)',
        built,
        'settlement: district setting',
      ),
      [
        ['settled height', berm.settledHeightFt, 'ft'],
        ['settlement', settingIfEntered('bermSettlementPercent'), '%'],
      ],
    ),
    figure(
      shown(
        'berm-earth',
        'Earth in the berm, compacted',
        'section as built · length / 27',
        earth,
        'geometry',
      ),
      [
        ['section', berm.areaFt2, 'ft²'],
        ['length', berm.lengthFt, 'ft'],
        ['fall of the ground', input.berm.groundFallFtPerFt, 'ft/ft'],
      ],
    ),
  ]
}
