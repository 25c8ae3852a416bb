import type { Criterion } from '../../../schemas/criteria.js'

type Rest = Omit<Criterion, 'id' | 'practice'>

/** A criterion read in its source, unless told otherwise. */
export const criterion = (
  id: string,
  practice: string,
  rest: Omit<Rest, 'confidence'> & { confidence?: Criterion['confidence'] },
): Criterion => ({ id, practice, confidence: 'read', ...rest })

/** A criterion whose limit each district enters for itself. */
export const districtCriterion = (
  id: string,
  practice: string,
  rest: Omit<Rest, 'confidence' | 'source' | 'limit'> & { setting: string; source?: string },
): Criterion => {
  const { setting, source = 'district setting', ...shown } = rest
  return { id, practice, ...shown, limit: { setting }, source, confidence: 'district-setting' }
}
