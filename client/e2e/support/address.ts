import { readFileSync } from 'node:fs'
import { join } from 'node:path'
import { runFolder } from './sign-ins'

/** The running Wadestone: given by `npm test`, else the one that `npm start` runs here. */
export const address = process.env.WADESTONE_ADDRESS ?? readFileSync(join(runFolder, 'address'), 'utf8')
