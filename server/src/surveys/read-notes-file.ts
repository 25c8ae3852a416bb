import { EngineeringInputError, Problem, readLevelNotesCsv, type LevelNotesCsv } from 'shared'

/** Level notes from an uploaded file, whichever of the two usual encodings the spreadsheet wrote. */
export function readNotesFile(bytes: Uint8Array): LevelNotesCsv {
  try {
    return readLevelNotesCsv({ text: decoded(bytes) })
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
