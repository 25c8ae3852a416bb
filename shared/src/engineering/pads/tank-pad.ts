import { EngineeringInputError } from '../engineering-input-error.js'
import { requireNumber } from '../require-number.js'
import { requireStoneRates } from '../rock/require-stone-rates.js'
import { stoneQuantity, type StoneQuantity } from '../rock/stone-quantity.js'

export interface PadStone {
  thicknessIn: number
  unitWeightTonsPerYd3: number
  wastePercent: number
  truckTons?: number
}

export interface RoundTank {
  shape: 'round'
  diameterFt: number
}

export interface RectangularTank {
  shape: 'rectangle'
  lengthFt: number
  widthFt: number
}

export type TankPadInput = (RoundTank | RectangularTank) & {
  /** From the tank's wall to the edge of the pad, ft. */
  reachFt: number
  rock?: PadStone
}

export interface TankPad {
  areaFt2: number
  tankAreaFt2: number
  rock?: StoneQuantity
}

/**
 * Rocked pad around a tank. Round: π((D/2 + r)² − (D/2)²). Rectangle: (l + 2r)(w + 2r) − l·w, with square corners.
 *
 * @param input.shape 'round' with diameterFt, or 'rectangle' with lengthFt and widthFt, ft > 0.
 * @param input.reachFt ft > 0; published least 10 ft.
 * @param input.rock thicknessIn in > 0 and the stone's figures, if rock is wanted.
 * @returns pad area and tank area (ft²), and the stone.
 * @throws EngineeringInputError naming the field.
 * @see reach: K-State, Livestock Watering Handbook, "Hardened Surface", undated; geometry: common practice, no source.
 * @example tankPad({ shape: 'rectangle', lengthFt: 10, widthFt: 4, reachFt: 10 }).areaFt2 // 680
 */
export function tankPad(input: TankPadInput): TankPad {
  const reachFt = requireNumber({ field: 'reachFt', value: input.reachFt, exclusiveMin: 0 })
  const { areaFt2, tankAreaFt2 } = planAreas(input, reachFt)
  if (input.rock === undefined) return { areaFt2, tankAreaFt2 }
  const value = input.rock.thicknessIn
  const thicknessFt = requireNumber({ field: 'rock.thicknessIn', value, exclusiveMin: 0 }) / 12
  const rates = requireStoneRates({ ...input.rock, prefix: 'rock.' })
  return { areaFt2, tankAreaFt2, rock: stoneQuantity({ volumeFt3: areaFt2 * thicknessFt, rates }) }
}

function planAreas(tank: RoundTank | RectangularTank, reachFt: number): Omit<TankPad, 'rock'> {
  if (tank.shape === 'round') {
    const radius = requireNumber({ field: 'diameterFt', value: tank.diameterFt, exclusiveMin: 0 }) / 2
    const tankAreaFt2 = Math.PI * radius ** 2
    return { areaFt2: Math.PI * (radius + reachFt) ** 2 - tankAreaFt2, tankAreaFt2 }
  }
  if (tank.shape === 'rectangle') {
    const length = requireNumber({ field: 'lengthFt', value: tank.lengthFt, exclusiveMin: 0 })
    const width = requireNumber({ field: 'widthFt', value: tank.widthFt, exclusiveMin: 0 })
    const tankAreaFt2 = length * width
    return { areaFt2: (length + 2 * reachFt) * (width + 2 * reachFt) - tankAreaFt2, tankAreaFt2 }
  }
  throw new EngineeringInputError({ field: 'shape', message: 'shape must be round or rectangle.' })
}
