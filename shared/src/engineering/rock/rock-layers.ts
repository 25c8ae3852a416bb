import { EngineeringInputError } from '../engineering-input-error.js'
import { requireNumber } from '../require-number.js'
import { requireStoneRates } from './require-stone-rates.js'
import { stoneQuantity, type StoneQuantity } from './stone-quantity.js'

export interface RockLayerInput {
  name: string
  stoneSizeIn: number
  thicknessIn: number
  unitWeightTonsPerYd3: number
  wastePercent: number
  truckTons?: number
}

/** Stone beside the slope itself (apron, toe key, thickening), bought with the layer that it is named for. */
export interface ExtraRock {
  name: string
  volumeFt3: number
  layer: string
}

export interface RockLayersInput {
  /** Length along the slope, not its plan length. */
  slopeLengthFt: number
  widthFt: number
  edgeRunPerRise: number
  /** Listed top down. */
  layers: readonly RockLayerInput[]
  extra?: readonly ExtraRock[]
}

export interface RockLayer extends StoneQuantity {
  name: string
  stoneSizeIn: number
  /** Depths below the finished surface, square to the slope. */
  topDepthFt: number
  bottomDepthFt: number
  /** Part of `volumeFt3` that came from `extra`. */
  extraFt3: number
}

export interface RockLayers {
  layers: RockLayer[]
  totalTons: number
  totalOrderTons: number
  totalVolumeYd3: number
  totalThicknessIn: number
}

/**
 * Stone of each layer. At depth y below the surface the rock is W + 2·e·y wide, so a layer from y1 to y2 holds
 * L · (W + e(y1 + y2)) · (y2 − y1) ft³; yd³ = ft³/27; tons = yd³ · unit weight; order = tons · (1 + waste);
 * loads = whole trucks of the order.
 *
 * @param input.slopeLengthFt ft > 0; input.widthFt finished width, ft > 0; input.edgeRunPerRise ≥ 0 (0 is a vertical
 *   edge), measured square to the slope.
 * @param input.layers 1 or more, top down: thicknessIn in > 0, stoneSizeIn in > 0, unitWeightTonsPerYd3 short tons per
 *   yd³ in place (0–4), wastePercent 0–100, truckTons short tons > 0 if loads are wanted.
 * @param input.extra volumes in ft³ ≥ 0, each added to the layer of that name.
 * @returns each layer's volume (ft³, yd³), tons, order tons, loads, depths (ft); totals.
 * @throws EngineeringInputError naming the field.
 * @see common practice, no source (prism with sloping edges); the unit weight is the quarry's or a district setting.
 * @example rockLayers({ slopeLengthFt: 20, widthFt: 20, edgeRunPerRise: 0, layers: [{ name: 'gravel', stoneSizeIn: 2,
 *   thicknessIn: 6, unitWeightTonsPerYd3: 1.42, wastePercent: 0 }] }).totalTons // 10.519
 */
export function rockLayers(input: RockLayersInput): RockLayers {
  const lengthFt = requireNumber({ field: 'slopeLengthFt', value: input.slopeLengthFt, exclusiveMin: 0 })
  const widthFt = requireNumber({ field: 'widthFt', value: input.widthFt, exclusiveMin: 0 })
  const edge = requireNumber({ field: 'edgeRunPerRise', value: input.edgeRunPerRise, min: 0 })
  if (!Array.isArray(input.layers) || input.layers.length === 0) {
    throw new EngineeringInputError({
      field: 'layers',
      message: 'The ramp needs at least one layer of rock.',
    })
  }
  const extras = extraByLayer(input)
  let topDepthFt = 0
  const layers = input.layers.map((layer: RockLayerInput, index): RockLayer => {
    const prefix = `layers[${index}].`
    const thicknessFt =
      requireNumber({ field: `${prefix}thicknessIn`, value: layer.thicknessIn, exclusiveMin: 0 }) / 12
    const size = requireNumber({ field: `${prefix}stoneSizeIn`, value: layer.stoneSizeIn, exclusiveMin: 0 })
    const rates = requireStoneRates({ ...layer, prefix })
    const bottomDepthFt = topDepthFt + thicknessFt
    const slopeFt3 = lengthFt * (widthFt + edge * (topDepthFt + bottomDepthFt)) * thicknessFt
    const extraFt3 = extras.get(layer.name) ?? 0
    const quantity = stoneQuantity({ volumeFt3: slopeFt3 + extraFt3, rates })
    const placed = { name: layer.name, stoneSizeIn: size, topDepthFt, bottomDepthFt, extraFt3, ...quantity }
    topDepthFt = bottomDepthFt
    return placed
  })
  const total = (pick: (layer: RockLayer) => number) => layers.reduce((sum, layer) => sum + pick(layer), 0)
  return {
    layers,
    totalTons: total(({ tons }) => tons),
    totalOrderTons: total(({ orderTons }) => orderTons),
    totalVolumeYd3: total(({ volumeYd3 }) => volumeYd3),
    totalThicknessIn: topDepthFt * 12,
  }
}

function extraByLayer({ layers, extra = [] }: RockLayersInput): Map<string, number> {
  const volumes = new Map<string, number>()
  extra.forEach(({ layer, volumeFt3 }, index) => {
    if (layers.filter(({ name }) => name === layer).length !== 1) {
      throw new EngineeringInputError({
        field: `extra[${index}].layer`,
        message: `extra[${index}].layer is "${layer}"; it must be the name of exactly one layer.`,
      })
    }
    const value = requireNumber({ field: `extra[${index}].volumeFt3`, value: volumeFt3, min: 0 })
    volumes.set(layer, (volumes.get(layer) ?? 0) + value)
  })
  return volumes
}
