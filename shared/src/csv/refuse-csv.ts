import { EngineeringInputError } from '../engineering/engineering-input-error.js'

/** A file that cannot be used as a whole, by a sentence for the person who chose it. */
export function refuseCsv(message: string): never {
  throw new EngineeringInputError({ field: 'text', message })
}
