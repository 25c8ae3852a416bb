import { mkdirSync } from 'node:fs'
import { dirname, join } from 'node:path'
import { fileURLToPath } from 'node:url'

export const root = dirname(dirname(dirname(fileURLToPath(import.meta.url))))

/** Where a running Wadestone keeps its address, logs and caught mail. The tests give it another place. */
export function runFolder() {
  const folder = process.env.RUN_FOLDER ?? join(root, '.run')
  mkdirSync(folder, { recursive: true })
  return folder
}
