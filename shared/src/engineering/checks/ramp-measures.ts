import { rampWidthFt } from '../herd/ramp-width-ft.js'
import { unknown, type MeasureTable } from './measure.js'
import { rimElevationFt } from './rim-elevation-ft.js'

const WIDEST_RULE_FT = 10_000

/** Figures of the ramp itself: grade, width, levels, reach and place. */
export const rampMeasures: MeasureTable = {
  grade: ({ input }) => input.ramp && { actual: input.ramp.gradeRunPerRise },
  'grade-preferred': ({ input }) => input.ramp && { actual: input.ramp.gradeRunPerRise },
  'width-for-herd': ({ input, part }) => {
    const herd = part('herd')
    return herd && input.ramp && { actual: input.ramp.widthFt, limit: herd.rampWidthFt }
  },
  'herd-two-accesses': ({ input, part }) => {
    const headCount = part('herd')?.headCount
    if (headCount === undefined || !input.herd) return undefined
    const rule = {
      baseFt: 10,
      perHeadFt: 0.1,
      rounding: 'none',
      minimumFt: 10,
      maximumFt: WIDEST_RULE_FT,
    } as const
    return { actual: rampWidthFt({ headCount, rule }) }
  },
  frontage: ({ input, part }) => {
    const herd = part('herd')
    return herd && input.ramp && { actual: input.ramp.widthFt, limit: herd.frontageNeededFt }
  },
  'top-above-full-pool': ({ part }) => {
    const profile = part('profile')
    return profile && { actual: profile.topElevationFt - profile.fullPoolElevationFt }
  },
  'top-and-flood-pool': ({ part }) => {
    const profile = part('profile')
    if (!profile) return undefined
    if (profile.topAboveFloodPoolFt === undefined) {
      return { ...unknown('flood pool not entered'), cautionWhenUnknown: true }
    }
    return { actual: profile.topAboveFloodPoolFt }
  },
  'rim-not-lowered': ({ input, part, setting }) => {
    const profile = part('profile')
    if (!profile || !input.site) return undefined
    const { topOfDamElevationFt: dam, floodPoolElevationFt: flood, groundLine } = input.site
    const freeboard = setting('rimFreeboardFt')
    const limit = dam ?? (flood === undefined || freeboard === undefined ? undefined : flood + freeboard)
    if (limit === undefined)
      return unknown('neither the top of dam nor flood pool with its freeboard is entered')
    return { actual: rimElevationFt({ profile, groundLine }), limit }
  },
  'toe-not-in-pit': ({ part }) => {
    const profile = part('profile')
    return profile && { actual: Math.max(0, -profile.toeMinusGroundFt) }
  },
  'toe-not-hanging': ({ part }) => {
    const profile = part('profile')
    return profile && { actual: Math.max(0, profile.toeMinusGroundFt) }
  },
  'drawdown-served': ({ part }) => {
    const profile = part('profile')
    return profile && { actual: profile.drawdownServedFt }
  },
  'reach-at-low-water': ({ part }) => {
    const profile = part('profile')
    return profile && { actual: profile.wetRunAtLowFt }
  },
  'reach-least': ({ part }) => {
    const profile = part('profile')
    return profile && { actual: profile.wetRunAtLowFt }
  },
  'depth-at-low-water': ({ part }) => {
    const profile = part('profile')
    return profile && { actual: profile.lowWaterElevationFt - profile.toeElevationFt }
  },
  'approach-slope': ({ input, part, setting }) => {
    const profile = part('profile')
    if (!profile || !input.ramp) return undefined
    const hasApproach = profile.surface.some((point) => point.part === 'approach')
    return hasApproach
      ? { actual: setting('approachGradeRunPerRise') ?? 10 }
      : unknown('the ramp top meets the ground, so there is no approach')
  },
  'dam-setback': ({ input }) => input.site && distance(input.site.distanceToDamFt),
  'spillway-setback': ({ input }) => input.site && distance(input.site.distanceToSpillwayFt),
  'inflow-setback': ({ input }) => input.site && distance(input.site.distanceToInflowFt),
}

const distance = (feet: number | undefined) =>
  feet === undefined ? unknown('distance not entered') : { actual: feet }
