import { bermCoverChoices, bermSoilChoices, fallChoices, stormChoices } from '../choice-words'
import { check, number, select, station, text } from '../field-specs'
import type { PartSpec } from '../part-spec'

export const runoffPart: PartSpec = {
  part: 'runoff',
  title: 'Runoff',
  sentence: 'The water that comes down the hillside in the design storm.',
  items: [
    number('areaAcres', 'Drainage area', 'acres'),
    number('curveNumber', 'Curve number'),
    number('rainfallIn', 'Rain in 24 hours', 'in'),
    text('rainfallSource', 'Where that figure is from'),
    number('returnPeriodYr', 'Return period', 'years'),
    select('distribution', 'Rainfall distribution', stormChoices),
    number('flowLengthFt', 'Flow length', 'ft', { hint: 'From the farthest point' }),
    number('landSlopePercent', 'Slope of the land', '%'),
    number('pondPercent', 'Ponds and swamps', '% of the area', { isOptional: true }),
    {
      kind: 'group',
      name: 'rational',
      title: 'Rational method',
      hint: 'A second way to the peak; the larger of the two governs.',
      empty: { intensities: [{}] },
      items: [
        number('runoffCoefficient', 'Runoff coefficient'),
        {
          kind: 'list',
          name: 'intensities',
          isCompact: true,
          title: 'Intensity of rain by duration',
          one: 'duration',
          hint: 'Of one return period, the shortest first',
          empty: {},
          isOrdered: true,
          items: [number('durationMin', 'Duration', 'min'), number('intensityInPerHr', 'Intensity', 'in/h')],
        },
      ],
    },
  ],
  start: () => ({}),
  results: ['runoff'],
}

export const bermPart: PartSpec = {
  part: 'berm',
  title: 'Berm',
  sentence: 'The ridge above the ramp that leads runoff aside.',
  items: [
    station('crestStationFt', 'Station of the crest'),
    number('channelGradeFtPerFt', 'Grade of the channel', 'ft/ft', { hint: 'Along the berm' }),
    number('groundFallFtPerFt', 'Fall of the ground', 'ft/ft', { hint: 'Across the berm' }),
    number('upslopeRunPerRise', 'Upslope face', ': 1'),
    number('downslopeRunPerRise', 'Downslope face', ': 1'),
    number('topWidthFt', 'Top width', 'ft'),
    number('roughnessHigh', 'Roughness, for capacity', undefined, { hint: 'Manning n, tall grass' }),
    number('roughnessLow', 'Roughness, for velocity', undefined, { hint: 'Manning n, short grass' }),
    number('minimumHeightFt', 'Height at least', 'ft', { hint: 'After it has settled' }),
    number('pastLeftFt', 'Past the ramp to the left', 'ft'),
    number('pastRightFt', 'Past the ramp to the right', 'ft'),
    select('falls', 'The channel falls', fallChoices),
    text('outletSurface', 'Surface at the outlet'),
    check('outletIsStable', 'The outlet is stable'),
    number('outletToRampFt', 'From outlet to ramp', 'ft'),
    select('soil', 'Soil of the channel', bermSoilChoices),
    select('cover', 'Cover of the channel', bermCoverChoices),
  ],
  start: () => ({ outletIsStable: false }),
  results: ['berm'],
}
