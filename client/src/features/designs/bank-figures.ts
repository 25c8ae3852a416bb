import { formatRatio, formatStation, type PartValues } from 'shared'
import { line, lineIfAny, said, type FigureLine } from './figure-line'

const station = (stationFt: number): string => formatStation({ stationFt, decimals: 1 })

export const herdFigures = (herd: PartValues['herd']): FigureLine[] => [
  line('Drink at once', herd.drinkingAtOnce, 'head', 0),
  line('Frontage needed', herd.frontageNeededFt, 'ft', 1),
  line('Width by the rule', herd.rampWidthFt, 'ft', 1),
  line('Water in a day', herd.dailyWater.totalGal, 'gal', 0),
]

export const profileFigures = (profile: PartValues['profile']): FigureLine[] => [
  line('Top', profile.topElevationFt, 'ft'),
  said('Top station', station(profile.topStationFt)),
  line('Toe', profile.toeElevationFt, 'ft'),
  said('Toe station', station(profile.toeStationFt)),
  line('Rise', profile.riseFt, 'ft'),
  line('Run', profile.runFt, 'ft'),
  line('Slope length', profile.slopeLengthFt, 'ft'),
  said('Grade', formatRatio(profile.gradeRunPerRise)),
  line('Wet at full pool', profile.wetSlopeLengthAtFullFt, 'ft'),
  line('Wet at low water', profile.wetSlopeLengthAtLowFt, 'ft'),
  line('Fall of the water it serves', profile.drawdownServedFt, 'ft'),
]

export const earthworkFigures = ({
  formationWidthFt,
  averageEndArea,
}: PartValues['earthwork']): FigureLine[] => [
  line('Width of the formation', formationWidthFt, 'ft'),
  line('Cut in the dry', averageEndArea.dryCutYd3, 'yd³', 1),
  line('Cut under water', averageEndArea.wetCutYd3, 'yd³', 1),
  line('Fill', averageEndArea.fillYd3, 'yd³', 1),
  line('Backfill at the edges', averageEndArea.edgeBackfillYd3, 'yd³', 1),
]

export const rockFigures = (rock: PartValues['rock']): FigureLine[] => [
  ...rock.layers.map(({ name, orderTons }) => line(`${name}, to order`, orderTons, 'tons', 1)),
  { ...line('Stone to order', rock.totalOrderTons, 'tons', 1), isSum: true },
  ...rock.layers.flatMap(({ name, loads }) => lineIfAny(`${name}, loads`, loads, undefined, 0)),
  line('Thickness in all', rock.totalThicknessIn, 'in', 1),
]

export const fabricFigures = (fabric: PartValues['fabric']): FigureLine[] => {
  const laid = fabric[fabric.recommended]
  return [
    said('Laid', `${fabric.recommended} the ramp: ${fabric.reason}`),
    line('Cover, net', fabric.netAreaFt2 / FT2_PER_YD2, 'yd²', 1),
    line('Strips', laid.strips, undefined, 0),
    line('Length of a strip', laid.stripLengthFt, 'ft', 1),
    line('Rolls', laid.rolls, undefined, 0),
  ]
}

const FT2_PER_YD2 = 9

export const padFigures = (pad: NonNullable<PartValues['approachPad']>): FigureLine[] => [
  said('From station', station(pad.fromStationFt)),
  said('To station', station(pad.toStationFt)),
  line('Area', pad.areaFt2, 'ft²', 0),
  line('Stone to order', pad.orderTons, 'tons', 1),
  line('Cut', pad.cutBankYd3, 'yd³', 1),
]

export const panelFigures = (panel: NonNullable<PartValues['closingPanel']>): FigureLine[] => [
  line('Length', panel.lengthFt, 'ft', 1),
  line('Deepest water', panel.deepestWaterFt, 'ft', 1),
  line('Height at the deepest post', panel.heightAtDeepestPostFt, 'ft', 1),
  line('Posts', panel.posts, undefined, 0),
  said('Stands on', panel.support === 'float' ? 'a float' : 'posts'),
]
