import { spawnSync } from 'node:child_process'
import { createHash } from 'node:crypto'
import { existsSync, readdirSync, readFileSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { root, runFolder } from './places.mjs'
import { giveUp, say } from './say.mjs'

const sources = [
  'shared/src',
  'server/src',
  'client/src',
  'client/index.html',
  'client/public',
  'package-lock.json',
]
const results = ['shared/dist/index.js', 'server/dist/main.js', 'client/dist/index.html']

function* files(path) {
  if (!existsSync(path)) return
  const entries = readdirSync(path, { withFileTypes: true, recursive: true })
  yield* entries.filter((entry) => entry.isFile()).map((entry) => join(entry.parentPath, entry.name))
}

function sourceHash() {
  const hash = createHash('sha256')
  for (const source of sources) {
    const path = join(root, source)
    const names = existsSync(path) && /\.\w+$/.test(source) ? [path] : [...files(path)].sort()
    for (const name of names) hash.update(name.slice(root.length)).update(readFileSync(name))
  }
  return hash.digest('hex')
}

/** Builds shared, server and client, unless nothing changed since the last build. */
export function build() {
  const stamp = join(runFolder(), 'built')
  const wanted = sourceHash()
  const isBuilt = results.every((file) => existsSync(join(root, file)))
  if (isBuilt && existsSync(stamp) && readFileSync(stamp, 'utf8') === wanted) return
  say('Building …')
  const { status } = spawnSync('npm', ['run', '--silent', 'build'], { cwd: root, stdio: 'inherit' })
  if (status !== 0) giveUp('The build did not finish. Its own words stand above.')
  writeFileSync(stamp, wanted)
}
