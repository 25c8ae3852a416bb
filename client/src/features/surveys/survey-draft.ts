import type { SurveyInput } from 'shared'
import { withoutEmpty } from '../../components/fields/without-empty'
import { noteColumns, pointColumns, type GridRow } from './grid-columns'
import { readRows, withRoom, writeRows } from './grid-rows'

/** A number field keeps what cannot be read as it was typed. */
type Typed = number | string | null | undefined

const closingKeys = [
  'knownElevationFt',
  'lengthFt',
  'lengthMiles',
  'coefficientFt',
  'perSetupFt',
  'minimumFt',
] as const

type ClosingDraft = Partial<Record<(typeof closingKeys)[number], Typed>>

/** The page as it is typed: both ways of measuring side by side, so that a change of mind loses nothing. */
export interface SurveyDraft {
  kind: SurveyInput['kind']
  startElevationFt?: Typed
  waterSurfaceFt?: Typed
  closing: ClosingDraft
  rows: GridRow[]
  points: GridRow[]
}

export function surveyDraft(survey: SurveyInput | null): SurveyDraft {
  const notes = survey?.kind === 'level-notes' ? survey : null
  const line = survey?.kind === 'ground-line' ? survey : null
  return {
    kind: survey?.kind ?? 'level-notes',
    startElevationFt: notes?.startElevationFt,
    waterSurfaceFt: survey?.waterSurfaceFt,
    // Always in this order, whichever order it was stored in, so that two drafts can be compared.
    closing: Object.fromEntries(closingKeys.map((key) => [key, notes?.closing?.[key]])),
    rows: withRoom(noteColumns, writeRows(noteColumns, notes?.rows ?? [])),
    points: withRoom(pointColumns, writeRows(pointColumns, line?.points ?? [])),
  }
}

/** A row that has a station but no name is called by its station, as in a field book. */
const named = (row: Record<string, unknown>, typed: GridRow | undefined): Record<string, unknown> =>
  row.label === undefined && row.stationFt !== undefined ? { label: typed?.stationFt?.trim(), ...row } : row

const sent = (survey: object) => withoutEmpty(survey) as Record<string, unknown>

/** What would be sent; figures that cannot be read stay as typed, and the schema says what would be right. */
export function readSurvey(draft: SurveyDraft): Record<string, unknown> {
  const { kind, points, rows, closing, startElevationFt, waterSurfaceFt } = draft
  if (kind === 'ground-line') {
    return sent({ kind, waterSurfaceFt, points: readRows(pointColumns, points) })
  }
  const isClosed = Object.values(closing).some((value) => value !== undefined && value !== null)
  return sent({
    kind,
    startElevationFt,
    waterSurfaceFt,
    rows: readRows(noteColumns, rows).map((row, index) => named(row, rows[index])),
    closing: isClosed ? closing : undefined,
  })
}
