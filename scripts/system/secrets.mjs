import { randomBytes } from 'node:crypto'
import { existsSync, readFileSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'

const secret = () => randomBytes(32).toString('base64url')

/** Keys made once for this database and kept beside it: the pepper must live as long as the password hashes. */
export function readOrMakeSecrets(dataFolder) {
  const file = join(dataFolder, 'secrets.json')
  if (!existsSync(file)) {
    const made = {
      jwtSecret: secret(),
      passwordPepper: secret(),
      cursorSecret: secret(),
      appDatabasePassword: secret(),
    }
    writeFileSync(file, JSON.stringify(made, null, 2), { mode: 0o600 })
  }
  return { file, ...JSON.parse(readFileSync(file, 'utf8')) }
}
