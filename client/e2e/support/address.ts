import { readFileSync } from 'node:fs'
import { join } from 'node:path'

export const runFolder = process.env.RUN_FOLDER ?? join(import.meta.dirname, '..', '..', '..', '.run')

/** The running Wadestone: given by `npm test`, else the one that `npm start` runs here. */
export const address = process.env.WADESTONE_ADDRESS ?? readFileSync(join(runFolder, 'address'), 'utf8')
