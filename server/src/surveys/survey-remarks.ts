import { formatFeet, type SurveyReduction } from 'shared'

const feet = (value: number): string => formatFeet(Math.abs(value), 3)

/** What the level notes leave open, in whole sentences. They are kept as they are: the planner may still be in the field. */
export function surveyRemarks(reduction: SurveyReduction | null): string[] {
  if (reduction === null) return []
  const { arithmeticCheckPasses, closes, misclosureFt, allowableFt, differenceFt } = reduction
  const remarks: string[] = []
  if (!arithmeticCheckPasses) {
    remarks.push(
      `The page check fails: backsights less foresights give ${feet(differenceFt)}, which is not the difference of the elevations.`,
    )
  }
  if (closes === false && misclosureFt !== undefined && allowableFt !== undefined) {
    remarks.push(
      `The level notes do not close: they miss the known elevation by ${feet(misclosureFt)}, and ${feet(allowableFt)} is allowed. Look for a misread rod, or run the line again.`,
    )
  }
  if (allowableFt !== undefined && closes === undefined) {
    remarks.push(
      'A known closing elevation is given, but the last row has no foresight, so the notes cannot be closed.',
    )
  }
  return remarks
}
