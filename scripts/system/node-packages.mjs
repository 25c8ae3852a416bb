import { spawnSync } from 'node:child_process'
import { createHash } from 'node:crypto'
import { existsSync, readFileSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { root } from './places.mjs'
import { giveUp, say } from './say.mjs'

const stamp = join(root, 'node_modules', '.wadestone-lock')

const lockHash = () =>
  createHash('sha256')
    .update(readFileSync(join(root, 'package-lock.json')))
    .digest('hex')

/** Installs the packages of the lock file when they are missing or older than it. */
export function installNodePackages() {
  const wanted = lockHash()
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === wanted) return
  say('Installing the Node packages of the lock file …')
  const { status } = spawnSync('npm', ['ci', '--no-audit', '--no-fund'], { cwd: root, stdio: 'inherit' })
  if (status !== 0) giveUp('npm ci did not finish. Its own words stand above.')
  writeFileSync(stamp, wanted)
}
