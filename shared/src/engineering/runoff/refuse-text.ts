import { EngineeringInputError } from '../engineering-input-error.js'

/** Refuses a rainfall file with one sentence; the field is always the file's text. */
export function refuseText(message: string): never {
  throw new EngineeringInputError({ field: 'text', message })
}
