import { unknown, type MeasureTable } from './measure.js'
import { FT2_PER_ACRE } from '../unit-factors.js'

/** Figures of earthwork, rock and fabric. */
export const surfaceMeasures: MeasureTable = {
  'cut-side': ({ input }) => input.earthwork && { actual: input.earthwork.cutSideRunPerRise },
  'fill-side': ({ input }) => input.earthwork && { actual: input.earthwork.fillSideRunPerRise },
  'rock-thickness-on-fabric': ({ part }) => {
    const rock = part('rock')
    return rock && { actual: rock.totalThicknessIn }
  },
  'rock-thickness-common': ({ part }) => {
    const rock = part('rock')
    return rock && { actual: rock.totalThicknessIn }
  },
  'surface-stone': ({ part }) => {
    const top = part('rock')?.layers[0]
    return top && { actual: top.stoneSizeIn }
  },
  'fabric-strength': ({ input }) =>
    input.fabric &&
    (input.fabric.grabStrengthLb === undefined
      ? unknown('strength of the fabric not entered')
      : { actual: input.fabric.grabStrengthLb }),
  'lap-dry': ({ input }) => input.fabric && { actual: input.fabric.lapDryFt },
  'lap-wet': ({ input, part }) => {
    const profile = part('profile')
    if (!input.fabric || !profile) return undefined
    return (profile.wetSlopeLengthTodayFt ?? 0) > 0
      ? { actual: input.fabric.lapWetFt }
      : unknown('no fabric is laid under water')
  },
  'disturbed-area': ({ part }) => {
    const seeding = part('seeding')
    return seeding && { actual: seeding.disturbedAreaFt2 / FT2_PER_ACRE }
  },
}
