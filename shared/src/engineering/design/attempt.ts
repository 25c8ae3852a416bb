import { EngineeringInputError } from '../engineering-input-error.js'
import { NotReady } from './not-ready.js'
import type { PartResult } from './part-result.js'

/**
 * Runs one part. A wrong input or something that is missing becomes a result with a sentence; any other error is a
 * fault of ours and goes on up.
 */
export function attempt<Value>(run: () => Value, pathOf: (field: string) => string): PartResult<Value> {
  try {
    return { ok: true, value: run() }
  } catch (error) {
    if (error instanceof NotReady) return error.result
    if (error instanceof EngineeringInputError) {
      return { ok: false, field: pathOf(error.field), message: error.message }
    }
    throw error
  }
}
