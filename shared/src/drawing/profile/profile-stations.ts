import { numberText } from '../../format/number-text.js'
import { levelNames } from '../level-names.js'
import { levelAt } from '../level-at.js'
import type { SheetModel } from '../sheet-model.js'
import { stationLabel } from '../station-label.js'

export interface ProfileStation {
  stationFt: number
  name: string
  finishedFt: number | null
  existingFt: number
}

/** The stations a builder sets out: every place where the finished surface changes or meets a water level. */
export function profileStations(model: SheetModel): ProfileStation[] {
  const { profile, pad, berm, closing } = model
  const names = levelNames[model.site.body]
  const last = model.ground.at(-1)?.stationFt ?? Infinity
  const named: [string, number | undefined, 'finished' | 'berm' | 'none'][] = [
    ['berm crest', berm?.plan.crestStationFt, 'berm'],
    ['pad', pad?.fromStationFt, 'none'],
    ['ramp top', profile.topStationFt, 'finished'],
    [names.high, profile.fullPoolEdgeStationFt, 'finished'],
    ['building', profile.waterTodayEdgeStationFt, 'finished'],
    [names.low, profile.lowWaterEdgeStationFt, 'finished'],
    ['toe', profile.toeStationFt, 'finished'],
    ['panel', closing?.stationFt, 'none'],
  ]
  return named
    .flatMap(([name, stationFt, kind]) => {
      if (stationFt === undefined || stationFt > last) return []
      const existingFt = levelAt(model.ground, stationFt)
      const finished = {
        finished: levelAt(profile.surface, stationFt),
        berm: existingFt + (berm?.value.builtHeightFt ?? 0),
        none: name === 'pad' ? existingFt : null,
      }
      return [{ stationFt, name, existingFt, finishedFt: finished[kind] }]
    })
    .sort((a, b) => a.stationFt - b.stationFt)
}

export const stationRows = ['Station', 'Place', 'Finished', 'Existing', 'Up or down']

export function stationCells({ stationFt, name, finishedFt, existingFt }: ProfileStation): string[] {
  const change = finishedFt === null ? '–' : numberText(finishedFt - existingFt, 2)
  return [
    stationLabel(stationFt),
    name,
    finishedFt === null ? '–' : numberText(finishedFt, 2),
    numberText(existingFt, 2),
    finishedFt !== null && finishedFt - existingFt > 0.005 ? `+${change}` : change,
  ]
}
