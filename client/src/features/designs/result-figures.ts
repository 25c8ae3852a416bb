import type { DesignResult } from 'shared'
import {
  earthworkFigures,
  fabricFigures,
  herdFigures,
  padFigures,
  panelFigures,
  profileFigures,
  rockFigures,
} from './bank-figures'
import type { FigureLine } from './figure-line'
import {
  bermFigures,
  costFigures,
  fenceFigures,
  fundingFigures,
  pondFigures,
  quantityFigures,
  runoffFigures,
  seedingFigures,
} from './land-figures'
import type { ResultKey } from './result-words'

type ReadyValue<Key extends ResultKey> =
  Extract<DesignResult[Key], { ok: true }> extends { value: infer Value } ? NonNullable<Value> : never

type Makers = { [Key in ResultKey]: (value: ReadyValue<Key>) => FigureLine[] }

const makers: Makers = {
  herd: herdFigures,
  profile: profileFigures,
  earthwork: earthworkFigures,
  rock: rockFigures,
  fabric: fabricFigures,
  approachPad: padFigures,
  closingPanel: panelFigures,
  fence: fenceFigures,
  runoff: runoffFigures,
  berm: bermFigures,
  pond: pondFigures,
  seeding: seedingFigures,
  quantities: quantityFigures,
  cost: costFigures,
  funding: fundingFigures,
}

/** The figures of one part that could be worked out; null where this job has no such part. */
export function resultFigures(key: ResultKey, value: unknown): FigureLine[] | null {
  // The key picks value and maker together; the compiler cannot follow that through the union of all parts.
  const make = makers[key] as (value: unknown) => FigureLine[]
  return value === null ? null : make(value)
}
