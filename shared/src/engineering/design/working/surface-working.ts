import { figure, type PartWorking } from './figure.js'

export const rockWorking: PartWorking = ({ partIfReady, input }) => {
  const rock = partIfReady('rock')
  const profile = partIfReady('profile')
  if (!rock || !profile || !input.rock || !input.ramp) return []
  const { widthFt } = input.ramp
  return rock.layers.flatMap((layer, index) => {
    const plan = input.rock?.layers[index]
    return [
      figure(
        {
          key: `rock-${index + 1}-volume`,
          part: 'rock',
          label: `${layer.name}, in place`,
          formula: 'length · (width + edge · (y1 + y2)) · (y2 − y1) / 27',
          result: layer.volumeYd3,
          unit: 'yd³',
          source: 'geometry',
        },
        [
          ['length', profile.rockedLengthFt, 'ft'],
          ['width', widthFt, 'ft'],
          ['edge', input.rock?.edgeRunPerRise, 'run per rise'],
          ['y1', layer.topDepthFt, 'ft'],
          ['y2', layer.bottomDepthFt, 'ft'],
        ],
      ),
      figure(
        {
          key: `rock-${index + 1}-order`,
          part: 'rock',
          label: `${layer.name}, to order`,
          formula: 'volume · unit weight · (1 + waste)',
          result: layer.orderTons,
          unit: 'tons',
          source: 'unit weight and waste as entered in the plan',
        },
        [
          ['volume', layer.volumeYd3, 'yd³'],
          ['unit weight', plan?.unitWeightTonsPerYd3, 'tons/yd³'],
          ['waste', plan?.wastePercent, '%'],
        ],
      ),
    ]
  })
}

export const fabricWorking: PartWorking = ({ partIfReady, input }) => {
  const fabric = partIfReady('fabric')
  if (!fabric || !input.fabric) return []
  const laid = fabric[fabric.recommended]
  const source = 'common practice, no source'
  return [
    figure(
      {
        key: 'fabric-cover',
        part: 'fabric',
        label: 'Ground the fabric covers',
        formula: '(formation + 2 · turn-up) · (slope length + top anchor + toe wrap)',
        result: fabric.netAreaFt2,
        unit: 'ft²',
        source,
      },
      [
        ['width covered', fabric.coverWidthFt, 'ft'],
        ['length covered', fabric.coverLengthFt, 'ft'],
      ],
    ),
    figure(
      {
        key: 'fabric-gross',
        part: 'fabric',
        label: `Fabric laid ${fabric.recommended} the ramp`,
        formula: 'strips · roll width · strip length',
        result: laid.grossAreaFt2,
        unit: 'ft²',
        source,
      },
      [
        ['strips', laid.strips, ''],
        ['roll width', input.fabric.rollWidthFt, 'ft'],
        ['strip length', laid.stripLengthFt, 'ft'],
      ],
    ),
  ]
}

export const padWorking: PartWorking = ({ partIfReady, input }) => {
  const pad = partIfReady('approachPad')
  const plan = input.pads?.approach
  if (!pad || !plan) return []
  return [
    figure(
      {
        key: 'pad-order',
        part: 'approachPad',
        label: 'Stone for the pad, to order',
        formula: '(length · width · thickness + thickening) / 27 · unit weight · (1 + waste)',
        result: pad.orderTons,
        unit: 'tons',
        source: 'unit weight and waste as entered in the plan',
      },
      [
        ['length', plan.lengthFt, 'ft'],
        ['width', plan.widthFt, 'ft'],
        ['thickness', plan.thicknessIn, 'in'],
        ['thickening', pad.thickeningVolumeYd3, 'yd³'],
        ['unit weight', plan.unitWeightTonsPerYd3, 'tons/yd³'],
        ['waste', plan.wastePercent, '%'],
      ],
    ),
  ]
}
