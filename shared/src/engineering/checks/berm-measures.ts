import { permissibleVelocity } from '../berm/permissible-velocity.js'
import { rampEdgeReachFt } from './ramp-edge-reach-ft.js'
import type { MeasureTable } from './measure.js'

/** Figures of runoff and berm. */
export const bermMeasures: MeasureTable = {
  'capacity-storm': ({ input }) => input.runoff && { actual: input.runoff.returnPeriodYr },
  'berm-drainage-area': ({ input }) => input.runoff && { actual: input.runoff.areaAcres },
  'berm-velocity': ({ input, part }) => {
    const berm = part('berm')
    if (!berm || !input.berm) return undefined
    const { soil, cover } = input.berm
    const { limitFtPerS } = permissibleVelocity({ table: 'berm', soil, cover })
    return { actual: berm.velocityFtPerS, ...(limitFtPerS === undefined ? {} : { limit: limitFtPerS }) }
  },
  'berm-froude': ({ part }) => {
    const berm = part('berm')
    return berm && { actual: berm.froude }
  },
  'berm-channel-grade': ({ input }) => input.berm && { actual: input.berm.channelGradeFtPerFt },
  'berm-side': ({ input }) => input.berm && { actual: steeperSide(input.berm) },
  'berm-side-mown': ({ input }) => input.berm && { actual: steeperSide(input.berm) },
  'berm-top-width': ({ input }) => input.berm && { actual: input.berm.topWidthFt },
  'berm-freeboard': ({ input, setting }) => {
    const actual = setting('bermFreeboardFt')
    return input.berm && actual !== undefined ? { actual } : undefined
  },
  'berm-past-ramp': ({ input, part }) => {
    const earthwork = part('earthwork')
    const profile = part('profile')
    if (!input.berm || !input.ramp || !input.earthwork || !earthwork || !profile) return undefined
    const edge = rampEdgeReachFt({
      earthwork,
      fullPoolEdgeStationFt: profile.fullPoolEdgeStationFt,
      widthFt: input.ramp.widthFt,
      ...input.earthwork,
    })
    return { actual: Math.min(input.berm.pastLeftFt, input.berm.pastRightFt) - edge }
  },
  'berm-clear-of-pad': ({ input, part }) => {
    const berm = part('berm')
    const profile = part('profile')
    const pad = part('approachPad')
    if (!berm || !profile || !input.berm || pad === undefined) return undefined
    const worksBegin = Math.min(pad?.fromStationFt ?? Infinity, profile.surface[0]?.stationFt ?? Infinity)
    return { actual: worksBegin - (input.berm.crestStationFt + berm.downslopeFootFromCentreFt) }
  },
  'berm-outlet': ({ input }) =>
    input.berm && { actual: input.berm.outletIsStable, note: input.berm.outletSurface },
  'berm-outlet-distance': ({ input }) => input.berm && { actual: input.berm.outletToRampFt },
}

const steeperSide = (berm: { upslopeRunPerRise: number; downslopeRunPerRise: number }) =>
  Math.min(berm.upslopeRunPerRise, berm.downslopeRunPerRise)
