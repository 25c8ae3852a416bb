import { figure, type PartWorking } from './figure.js'

const common = 'common practice, no source'

export const profileWorking: PartWorking = ({ partIfReady, input }) => {
  const profile = partIfReady('profile')
  if (!profile || !input.ramp) return []
  const part = 'profile'
  const { topElevationFt, toeElevationFt, riseFt, runFt, gradeRunPerRise, fullPoolElevationFt } = profile
  const { topAboveFullPoolFt, toeBelowFullPoolFt } = input.ramp
  const { lowWaterElevationFt, drinkingDepthAtLowWaterFt, slopeLengthFt, drawdownServedFt } = profile
  const show = (key: string, label: string, formula: string, result: number, source = common) => ({
    key,
    part: part as typeof part,
    label,
    formula,
    result,
    unit: 'ft',
    source,
  })
  return [
    figure(show('top-elevation', 'Top of the ramp', 'full pool + top above full pool', topElevationFt), [
      ['full pool', fullPoolElevationFt, 'ft'],
      ['top above full pool', topAboveFullPoolFt, 'ft'],
    ]),
    figure(
      show(
        'toe-elevation',
        'Toe of the ramp',
        'the lower of full pool − toe below full pool and low water − drinking depth',
        toeElevationFt,
      ),
      [
        ['full pool', fullPoolElevationFt, 'ft'],
        ['toe below full pool', toeBelowFullPoolFt, 'ft'],
        ['low water', lowWaterElevationFt, 'ft'],
        ['drinking depth', drinkingDepthAtLowWaterFt, 'ft'],
      ],
    ),
    figure(show('run', 'Run of the ramp', '(top − toe) · grade', runFt), [
      ['top', topElevationFt, 'ft'],
      ['toe', toeElevationFt, 'ft'],
      ['grade', gradeRunPerRise, 'run per rise'],
    ]),
    figure(show('slope-length', 'Length along the slope', '√(run² + rise²)', slopeLengthFt, 'geometry'), [
      ['run', runFt, 'ft'],
      ['rise', riseFt, 'ft'],
    ]),
    figure(
      show(
        'drawdown-served',
        'Fall of the water that is served',
        'full pool − (toe + drinking depth)',
        drawdownServedFt,
        'George & Murphy, K-State, "Construction of a Limited Access Ramp" (undated): allow 4 ft',
      ),
      [
        ['full pool', fullPoolElevationFt, 'ft'],
        ['toe', toeElevationFt, 'ft'],
        ['drinking depth', drinkingDepthAtLowWaterFt, 'ft'],
      ],
    ),
  ]
}
