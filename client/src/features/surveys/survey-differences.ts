import type { SurveyInput } from 'shared'
import type { Difference } from '../../components/feedback/stale-choice'
import { noteColumns, pointColumns, type GridColumn, type GridRow } from './grid-columns'
import { readSurvey, surveyDraft, type SurveyDraft } from './survey-draft'

const words = (value: unknown): string =>
  value === undefined || value === null || value === '' ? 'empty' : String(value)

const kindWords: Record<SurveyInput['kind'], string> = {
  'level-notes': 'level notes',
  'ground-line': 'ground line',
}

const closingLabels = {
  knownElevationFt: 'Known elevation',
  lengthFt: 'Length of the line',
  lengthMiles: 'Length in miles',
  coefficientFt: 'Allowed for one mile',
  perSetupFt: 'Allowed for one setup',
  minimumFt: 'Allowed at least',
} as const

const differing = (label: string, mine: unknown, theirs: unknown): Difference[] =>
  words(mine) === words(theirs) ? [] : [{ label, mine: words(mine), theirs: words(theirs) }]

function rowDifferences(
  columns: readonly GridColumn[],
  mine: readonly GridRow[],
  theirs: readonly GridRow[],
): Difference[] {
  return Array.from({ length: Math.max(mine.length, theirs.length) }, (_, index) =>
    columns.flatMap(({ key, title, read }) => {
      const meant = (rows: readonly GridRow[]) => read(rows[index]?.[key]?.trim() ?? '')
      return differing(`Row ${index + 1}, ${title.toLowerCase()}`, meant(mine), meant(theirs))
    }),
  ).flat()
}

/** Field by field what differs between the page as typed and the survey that somebody else saved. */
export function surveyDifferences(mine: SurveyDraft, survey: SurveyInput | null): Difference[] {
  const theirs = surveyDraft(survey)
  const closing = Object.entries(closingLabels).flatMap(([key, label]) => {
    const field = key as keyof typeof closingLabels
    return differing(label, mine.closing[field], theirs.closing[field])
  })
  return [
    ...differing('Kind of survey', kindWords[mine.kind], kindWords[theirs.kind]),
    ...differing('Starting elevation', mine.startElevationFt, theirs.startElevationFt),
    ...differing('Water surface', mine.waterSurfaceFt, theirs.waterSurfaceFt),
    ...(mine.kind === 'level-notes' ? closing : []),
    ...(mine.kind === 'level-notes'
      ? rowDifferences(noteColumns, mine.rows, theirs.rows)
      : rowDifferences(pointColumns, mine.points, theirs.points)),
  ]
}

/** Whether the page holds something that is not saved. */
export const isSurveyChanged = (mine: SurveyDraft, saved: SurveyInput | null): boolean =>
  JSON.stringify(readSurvey(mine)) !== JSON.stringify(readSurvey(surveyDraft(saved)))
