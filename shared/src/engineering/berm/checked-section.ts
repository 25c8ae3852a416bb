import { EngineeringInputError } from '../engineering-input-error.js'
import { requireNumber } from '../require-number.js'
import type { ChannelSection } from './channel-section.js'

const MOST_RUN_PER_RISE = 1000

/**
 * A channel section whose every measure can be used.
 *
 * @throws EngineeringInputError naming the field, below `field` when the section is part of a larger input.
 * @example checkedSection({ shape: 'triangle', leftRunPerRise: 3, rightRunPerRise: 3 })
 */
export function checkedSection(section: ChannelSection, field = 'section'): ChannelSection {
  const measure = (name: string, value: unknown, limits: object) =>
    requireNumber({ field: `${field}.${name}`, value, ...limits })
  if (section.shape === 'parabola') {
    return {
      shape: 'parabola',
      topWidthFt: measure('topWidthFt', section.topWidthFt, { exclusiveMin: 0 }),
      depthFt: measure('depthFt', section.depthFt, { exclusiveMin: 0 }),
    }
  }
  if (section.shape !== 'trapezoid' && section.shape !== 'triangle') {
    throw new EngineeringInputError({
      field: `${field}.shape`,
      message: `${field}.shape is not known; it must be trapezoid, triangle or parabola.`,
    })
  }
  const side = { min: 0, max: MOST_RUN_PER_RISE }
  const leftRunPerRise = measure('leftRunPerRise', section.leftRunPerRise, side)
  const rightRunPerRise = measure('rightRunPerRise', section.rightRunPerRise, side)
  if (section.shape === 'trapezoid') {
    const bottomWidthFt = measure('bottomWidthFt', section.bottomWidthFt, { min: 0 })
    if (bottomWidthFt + leftRunPerRise + rightRunPerRise === 0) refuseSlit(`${field}.bottomWidthFt`)
    return { shape: 'trapezoid', bottomWidthFt, leftRunPerRise, rightRunPerRise }
  }
  if (leftRunPerRise + rightRunPerRise === 0) refuseSlit(`${field}.leftRunPerRise`)
  return { shape: 'triangle', leftRunPerRise, rightRunPerRise }
}

function refuseSlit(field: string): never {
  throw new EngineeringInputError({
    field,
    message: `${field} is 0 and the sides are upright; the channel has no width.`,
  })
}
