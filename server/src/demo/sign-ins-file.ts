import { existsSync, mkdirSync, renameSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import type { Role } from 'shared'

/** How an example person signs in. The start prints these; tour and browser tests read them. */
export interface SignIn {
  district: string
  role: Role
  name: string
  email: string
  password: string
}

const fileIn = (runFolder: string): string => join(runFolder, 'demo-sign-ins.json')

export const hasSignIns = (runFolder: string): boolean => existsSync(fileIn(runFolder))

/** Put in place whole: a file that was cut short would lock everybody out. */
export function writeSignIns(runFolder: string, signIns: readonly SignIn[]): void {
  mkdirSync(runFolder, { recursive: true })
  const file = fileIn(runFolder)
  const begun = `${file}.${process.pid}`
  writeFileSync(begun, `${JSON.stringify(signIns, null, 2)}\n`, { mode: 0o600 })
  renameSync(begun, file)
}
