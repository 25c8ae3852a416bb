import { EngineeringInputError, Problem } from 'shared'

/** Hands an uploaded file to its reader as text, whichever of the two usual encodings the spreadsheet wrote. */
export function readTextFile<Content>(bytes: Uint8Array, read: (text: string) => Content): Content {
  try {
    return read(decoded(bytes))
  } catch (error) {
    if (!(error instanceof EngineeringInputError)) throw error
    throw new Problem('unreadable-file', {
      detail: error.message,
      fields: [{ pointer: '/file', message: error.message }],
    })
  }
}

function decoded(bytes: Uint8Array): string {
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes)
  } catch {
    return new TextDecoder('windows-1252').decode(bytes)
  }
}
