import {
  EngineeringInputError,
  groundLineFromNotes,
  levelClosingSchema,
  levelNoteRowSchema,
  reduceLevelNotes,
  resolveGroundLine,
  surveyInputSchema,
  type GroundPoint,
  type LevelNoteRow,
  type ReducedLevelNotes,
} from 'shared'

/** What can be worked out while a survey is still being typed. */
export interface SurveySoFar {
  reduction: ReducedLevelNotes | null
  groundLine: GroundPoint[]
  /** Why it goes no further, in the words of the formula. */
  sentence: string | null
}

const nothing = (sentence: string | null): SurveySoFar => ({ reduction: null, groundLine: [], sentence })

/** Works without the last that is wrong: a half-typed row does not take the elevations above it away. */
export function reduceSoFar(typed: Record<string, unknown>): SurveySoFar {
  return typed.kind === 'ground-line' ? lineSoFar(typed) : notesSoFar(typed)
}

function lineSoFar(typed: Record<string, unknown>): SurveySoFar {
  const parsed = surveyInputSchema.safeParse(typed)
  if (!parsed.success || parsed.data.kind !== 'ground-line') return nothing(null)
  const { points, waterSurfaceFt } = parsed.data
  return attempt(() => ({
    ...nothing(null),
    groundLine: resolveGroundLine({ groundLine: points, waterSurfaceFt }),
  }))
}

function notesSoFar(typed: Record<string, unknown>): SurveySoFar {
  const { startElevationFt, waterSurfaceFt } = typed
  if (typeof startElevationFt !== 'number') return nothing(null)
  const closing = levelClosingSchema.safeParse(typed.closing)
  const shared = {
    startElevationFt,
    ...(typeof waterSurfaceFt === 'number' ? { waterSurfaceFt } : {}),
    ...(closing.success ? { closing: closing.data } : {}),
  }
  const rows = readableRows(typed.rows)
  const found = reduced({ ...shared, rows })
  if (!(found instanceof EngineeringInputError)) return withGroundLine(found, null)
  // A closing that is not complete yet must not hide the elevations.
  const isClosing = found.field.startsWith('closing')
  const upTo = isClosing ? rows.length : Number(/^rows\[(\d+)\]/.exec(found.field)?.[1] ?? 0)
  const earlier = reduced({ ...shared, closing: undefined, rows: rows.slice(0, upTo) })
  const sentence = isClosing ? null : found.message
  return earlier instanceof EngineeringInputError ? nothing(sentence) : withGroundLine(earlier, sentence)
}

function readableRows(rows: unknown): LevelNoteRow[] {
  const readable: LevelNoteRow[] = []
  for (const row of Array.isArray(rows) ? rows : []) {
    const parsed = levelNoteRowSchema.safeParse(row)
    if (!parsed.success) break
    readable.push(parsed.data)
  }
  return readable
}

function reduced(input: Parameters<typeof reduceLevelNotes>[0]): ReducedLevelNotes | EngineeringInputError {
  try {
    return reduceLevelNotes(input)
  } catch (error) {
    if (error instanceof EngineeringInputError) return error
    throw error
  }
}

const withGroundLine = (reduction: ReducedLevelNotes, sentence: string | null): SurveySoFar => {
  const line = attempt(() => ({
    ...nothing(null),
    groundLine: groundLineFromNotes({ points: reduction.points }),
  }))
  return { reduction, groundLine: line.groundLine, sentence: sentence ?? line.sentence }
}

function attempt(work: () => SurveySoFar): SurveySoFar {
  try {
    return work()
  } catch (error) {
    if (error instanceof EngineeringInputError) return nothing(error.message)
    throw error
  }
}
