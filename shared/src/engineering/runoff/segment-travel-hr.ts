import { manningVelocityFtPerS } from '../berm/manning-velocity-ft-per-s.js'
import { requireNumber } from '../require-number.js'
import type {
  ChannelManningSegment,
  ChannelVelocitySegment,
  SheetSegment,
  ShallowSegment,
  TravelSegment,
} from './travel-segment.js'

interface SegmentContext {
  /** Where the segment stands in the input, such as segments[0]. */
  at: string
  sheetLengthLimitFt: number
}

/** Shallow concentrated flow: V = k √s, ft/s. TR-55, 2nd ed., June 1986, appendix F. */
const SHALLOW_VELOCITY_FACTOR = { unpaved: 16.1345, paved: 20.3282 } as const

const SECONDS_PER_HOUR = 3600

const positive = (at: string, name: string, value: unknown, max: number) =>
  requireNumber({ field: `${at}.${name}`, value, exclusiveMin: 0, max })

/**
 * Travel time over one stretch of the flow path.
 * Sheet: Tt = 0.007 (nL)^0.8 / (P2^0.5 s^0.4) h. Shallow: V = 16.1345 √s unpaved or 20.3282 √s paved.
 * Channel: V as given or by Manning. Tt = L/(3600 V).
 *
 * @returns Tt in hours.
 * @throws EngineeringInputError naming the segment's field.
 * Source: USDA NRCS, TR-55, 2nd ed., June 1986, ch. 3 and appendix F.
 * @example segmentTravelHr({ kind: 'channel', lengthFt: 3600, velocityFtPerS: 2 }, { at: 'segments[0]', sheetLengthLimitFt: 100 }) // 0.5
 */
export function segmentTravelHr(segment: TravelSegment, context: SegmentContext): number {
  if (segment.kind === 'sheet') return sheetHr(segment, context)
  const L = positive(context.at, 'lengthFt', segment.lengthFt, 1e6)
  const V = segment.kind === 'shallow' ? shallowVelocity(segment, context) : channelVelocity(segment, context)
  return L / (SECONDS_PER_HOUR * V)
}

function sheetHr(segment: SheetSegment, { at, sheetLengthLimitFt }: SegmentContext): number {
  const L = positive(at, 'lengthFt', segment.lengthFt, sheetLengthLimitFt)
  const s = positive(at, 'slopeFtPerFt', segment.slopeFtPerFt, 1)
  const n = requireNumber({ field: `${at}.roughness`, value: segment.roughness, min: 0.005, max: 1 })
  const P2 = positive(at, 'twoYearRainfallIn', segment.twoYearRainfallIn, 100)
  return (0.007 * (n * L) ** 0.8) / (P2 ** 0.5 * s ** 0.4)
}

function shallowVelocity(segment: ShallowSegment, { at }: SegmentContext): number {
  const s = positive(at, 'slopeFtPerFt', segment.slopeFtPerFt, 1)
  return SHALLOW_VELOCITY_FACTOR[segment.surface] * Math.sqrt(s)
}

function channelVelocity(
  segment: ChannelVelocitySegment | ChannelManningSegment,
  { at }: SegmentContext,
): number {
  if ('velocityFtPerS' in segment) return positive(at, 'velocityFtPerS', segment.velocityFtPerS, 100)
  return manningVelocityFtPerS({
    hydraulicRadiusFt: positive(at, 'hydraulicRadiusFt', segment.hydraulicRadiusFt, 1000),
    slopeFtPerFt: positive(at, 'slopeFtPerFt', segment.slopeFtPerFt, 1),
    roughness: requireNumber({ field: `${at}.roughness`, value: segment.roughness, min: 0.005, max: 1 }),
  })
}
