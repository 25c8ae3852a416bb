import { EngineeringInputError, Problem, readScheduleLinesCsv, type ScheduleCsv } from 'shared'

/** Lines of a schedule from an uploaded file, whichever of the two usual encodings the spreadsheet wrote. */
export function readScheduleFile(bytes: Uint8Array): ScheduleCsv {
  try {
    return readScheduleLinesCsv({ text: decoded(bytes) })
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
