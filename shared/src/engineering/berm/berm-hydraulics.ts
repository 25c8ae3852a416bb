import { EngineeringInputError } from '../engineering-input-error.js'
import type { BermDesignInput, BermResistance } from './berm-design-types.js'
import type { ChannelSection } from './channel-section.js'
import { normalDepth } from './normal-depth.js'

export interface BermHydraulics {
  depthFt: number
  capacityVelocityFtPerS: number
  lowResistanceDepthFt: number
  velocityFtPerS: number
  froude: number
  notes: string[]
}

interface BermHydraulicsInput extends Pick<
  BermDesignInput,
  'channelGradeFtPerFt' | 'resistanceHigh' | 'resistanceLow'
> {
  channel: ChannelSection | undefined
  armFlowCfs: number
}

const FROUDE_CAUTION = 0.8
const NO_FLOW: BermHydraulics = {
  depthFt: 0,
  capacityVelocityFtPerS: 0,
  lowResistanceDepthFt: 0,
  velocityFtPerS: 0,
  froude: 0,
  notes: [],
}

/**
 * Depth of a berm's channel at its highest resistance, for capacity; velocity and Froude number at the depth found
 * anew at its lowest resistance, for stability.
 *
 * @returns depths in ft, velocities in ft/s; all 0 without flow.
 * @throws EngineeringInputError naming the field of resistanceHigh, resistanceLow or channelGradeFtPerFt.
 * Source: FHWA HEC-22, 4th ed., Feb 2024, ch. 6; the two resistances are common practice.
 * @example bermHydraulics({ channel, armFlowCfs: 7, channelGradeFtPerFt: 0.008, resistanceHigh: { roughness: 0.1 }, resistanceLow: { roughness: 0.04 } })
 */
export function bermHydraulics(input: BermHydraulicsInput): BermHydraulics {
  const { channel } = input
  if (!channel || input.armFlowCfs === 0) return { ...NO_FLOW, notes: [] }
  const flowWith = (resistance: BermResistance, field: string) =>
    renaming(field, () =>
      normalDepth({
        section: channel,
        flowCfs: input.armFlowCfs,
        slopeFtPerFt: input.channelGradeFtPerFt,
        ...('retardance' in resistance ? { resistance } : resistance),
      }),
    )
  const high = flowWith(input.resistanceHigh, 'resistanceHigh')
  const low = flowWith(input.resistanceLow, 'resistanceLow')
  if (low.roughness > high.roughness) {
    throw new EngineeringInputError({
      field: 'resistanceLow',
      message:
        'resistanceLow is rougher than resistanceHigh; the lowest resistance must not exceed the highest.',
    })
  }
  return {
    depthFt: high.depthFt,
    capacityVelocityFtPerS: high.velocityFtPerS,
    lowResistanceDepthFt: low.depthFt,
    velocityFtPerS: low.velocityFtPerS,
    froude: low.froude,
    notes: [
      ...new Set([...high.notes, ...low.notes]),
      ...(low.froude > FROUDE_CAUTION
        ? [`Froude number is above ${FROUDE_CAUTION}: the surface becomes wavy and the depth uncertain.`]
        : []),
    ],
  }
}

/** The form knows the berm's field names, not those of the flow formula. */
function renaming<T>(field: string, run: () => T): T {
  try {
    return run()
  } catch (error) {
    if (!(error instanceof EngineeringInputError)) throw error
    if (error.field === 'slopeFtPerFt') throw renamed(error, 'slopeFtPerFt', 'channelGradeFtPerFt')
    if (error.field === 'roughness') throw renamed(error, 'roughness', `${field}.roughness`)
    if (error.field === 'resistance.retardance') throw renamed(error, 'resistance', field)
    throw error
  }
}

const renamed = (error: EngineeringInputError, from: string, to: string) =>
  new EngineeringInputError({
    field: error.field.replace(from, to),
    message: error.message.replace(from, to),
  })
