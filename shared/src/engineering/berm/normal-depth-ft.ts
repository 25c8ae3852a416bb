import { normalDepth, type NormalDepthInput } from './normal-depth.js'

/**
 * Depth of uniform flow alone; `normalDepth` gives the flow at that depth beside it.
 *
 * @returns depth in ft, to 1e-9; 0 for flow 0.
 * @throws EngineeringInputError naming the field.
 * Source: FHWA HEC-22, Urban Drainage Design Manual, 4th ed., FHWA-HIF-24-006, Feb 2024, ch. 6 (k = 1.486).
 * @example normalDepthFt({ section: { shape: 'trapezoid', bottomWidthFt: 3, leftRunPerRise: 3, rightRunPerRise: 3 }, flowCfs: 28, roughness: 0.03, slopeFtPerFt: 0.01 }) // 1.12
 */
export const normalDepthFt = (input: NormalDepthInput): number => normalDepth(input).depthFt
