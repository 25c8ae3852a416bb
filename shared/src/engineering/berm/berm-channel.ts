import { EngineeringInputError } from '../engineering-input-error.js'
import { requireNumber } from '../require-number.js'
import type { BermDesignInput } from './berm-design-types.js'
import type { ChannelSection } from './channel-section.js'
import { checkedSection } from './checked-section.js'

type BermChannelInput = Pick<
  BermDesignInput,
  'flowCfs' | 'cutChannel' | 'upslopeRunPerRise' | 'groundFallFtPerFt'
>

/**
 * Channel along the upslope foot of a berm: the one that is cut, or else the triangle between the ridge face z1 and
 * the natural ground 1/q.
 *
 * @returns the section, or undefined when there is neither a cut channel nor any flow.
 * @throws EngineeringInputError naming cutChannel's field, or groundFallFtPerFt where level ground leaves no channel.
 * @example bermChannel({ flowCfs: 7, upslopeRunPerRise: 4, groundFallFtPerFt: 1 / 30 }) // { shape: 'triangle', leftRunPerRise: 30, rightRunPerRise: 4 }
 */
export function bermChannel(input: BermChannelInput): ChannelSection | undefined {
  if (input.cutChannel) return checkedSection(input.cutChannel, 'cutChannel')
  if (input.flowCfs === 0) return undefined
  const value = input.groundFallFtPerFt
  const q = requireNumber({ field: 'groundFallFtPerFt', value, min: 0, max: 1 })
  if (q === 0) {
    throw new EngineeringInputError({
      field: 'groundFallFtPerFt',
      message: 'groundFallFtPerFt is 0: on level ground water spreads without end; give a cut channel.',
    })
  }
  const z1 = requireNumber({ field: 'upslopeRunPerRise', value: input.upslopeRunPerRise, min: 0, max: 100 })
  return { shape: 'triangle', leftRunPerRise: 1 / q, rightRunPerRise: z1 }
}
