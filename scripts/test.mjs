// npm test: every suite of the project on a throw-away database. Names of suites may follow.
import { chmodSync, mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { build } from './system/build.mjs'
import { Children } from './system/children.mjs'
import { needDebianPackages } from './system/debian-packages.mjs'
import { installNodePackages } from './system/node-packages.mjs'
import { giveUp } from './system/say.mjs'
import { runSuite, suites } from './system/suites.mjs'
import { startDatabase, stopDatabase } from './system/database.mjs'
import { startWadestone } from './system/wadestone.mjs'

const names = process.argv.slice(2)
const scratch = mkdtempSync(join(tmpdir(), 'wadestone-test-'))
// The database server runs as another user when this runs as root.
chmodSync(scratch, 0o755)
const dataFolder = join(scratch, 'data')

installNodePackages()
needDebianPackages('postgresql', 'chromium', 'qpdf', 'poppler-utils')
build()

process.env.RUN_FOLDER = join(scratch, 'run')
const chosen = suites.filter(({ name }) => names.length === 0 || names.includes(name))
if (chosen.length === 0)
  giveUp(`There is no such suite. There are: ${suites.map(({ name }) => name).join(', ')}.`, 2)

const children = new Children()
const total = { passed: 0, failed: 0, skipped: 0 }

async function runAll() {
  const { ownerUrl } = startDatabase(dataFolder)
  for (const suite of chosen) {
    const env = { TEST_DATABASE_OWNER_URL: ownerUrl, TEST_DATA_FOLDER: dataFolder }
    if (suite.name === 'browser') {
      const running = await startWadestone({ children, dataFolder, wantedPort: 0, wantedMailPort: 0 })
      Object.assign(env, { WADESTONE_ADDRESS: running.address })
    }
    const counts = runSuite(suite, { reportFolder: scratch, env })
    for (const key of Object.keys(total)) total[key] += counts[key]
  }
}

let stopped = false
async function stopAll() {
  if (stopped) return
  stopped = true
  await children.stopAll()
  stopDatabase(dataFolder)
  rmSync(scratch, { recursive: true, force: true })
}
for (const signal of ['SIGINT', 'SIGTERM'])
  process.on(signal, () => void stopAll().then(() => process.exit(130)))

try {
  await runAll()
} catch (error) {
  console.error(error)
  total.failed += 1
} finally {
  await stopAll()
}
console.log(`\n${total.passed} passed, ${total.failed} failed, ${total.skipped} skipped`)
process.exit(total.failed === 0 ? 0 : 1)
