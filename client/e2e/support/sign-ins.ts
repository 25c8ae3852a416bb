import { readFileSync } from 'node:fs'
import { join } from 'node:path'
import type { Role } from 'shared'

export interface SignIn {
  district: string
  role: Role
  name: string
  email: string
  password: string
}

export const runFolder = process.env.RUN_FOLDER ?? join(import.meta.dirname, '..', '..', '..', '.run')

const all = JSON.parse(readFileSync(join(runFolder, 'demo-sign-ins.json'), 'utf8')) as SignIn[]

/** The example person of a role in the first district; the second planner makes technical checks. */
export function signInOf(role: Role, index = 0, district = all[0]?.district): SignIn {
  const found = all.filter((each) => each.role === role && each.district === district)[index]
  if (found === undefined) throw new Error(`The example districts have no ${role} number ${index}.`)
  return found
}

/** The name of a district other than the first. */
export function otherDistrict(): string {
  const other = all.find(({ district }) => district !== all[0]?.district)
  if (other === undefined) throw new Error('There is only one example district.')
  return other.district
}
