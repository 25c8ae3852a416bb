import { figure, type PartWorking } from './figure.js'

export const herdWorking: PartWorking = ({ partIfReady, input }) => {
  const herd = partIfReady('herd')
  if (!herd || !input.herd) return []
  const { headCount, rampWidthFt, drinkingAtOnce, frontageNeededFt, dailyWater } = herd
  const part = 'herd'
  return [
    figure(
      {
        key: 'ramp-width',
        part,
        label: 'Ramp width for the herd',
        formula: '10 ft + 1 ft for every 10 head',
        result: rampWidthFt,
        unit: 'ft',
        source: 'K-State, Livestock Watering Handbook, "Limited Access" (undated)',
      },
      [['head', headCount, '']],
    ),
    figure(
      {
        key: 'frontage',
        part,
        label: 'Frontage needed',
        formula: 'head at once · feet a head',
        result: frontageNeededFt,
        unit: 'ft',
        source: 'Ohio State University Extension, fact sheet ANR-12, 11 February 2003',
      },
      [
        ['head at once', drinkingAtOnce, ''],
        ['feet a head', input.herd.frontageFtPerHead, 'ft'],
      ],
    ),
    figure(
      {
        key: 'daily-water',
        part,
        label: 'Drinking water on the hottest day',
        formula: 'sum of head · gallons a head',
        result: dailyWater.totalGal,
        unit: 'gal/day',
        source: [...new Set(dailyWater.classes.map(({ source }) => source))].join('; '),
      },
      dailyWater.classes.map(({ row, perHeadGal }) => [row, perHeadGal, 'gal'] as const),
    ),
  ]
}
