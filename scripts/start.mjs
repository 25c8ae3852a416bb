// npm start: from a fresh clone to a running Wadestone with one command. Ctrl-C stops all of it.
import { existsSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { build } from './system/build.mjs'
import { Children } from './system/children.mjs'
import { needDebianPackages } from './system/debian-packages.mjs'
import { installNodePackages } from './system/node-packages.mjs'
import { runFolder } from './system/places.mjs'
import { giveUp, say } from './system/say.mjs'
import { startWadestone, stopWadestone } from './system/wadestone.mjs'

const demo = process.env.DEMO ?? 'on'
const children = new Children()
let stopping = false

async function stop(code) {
  if (stopping) return
  stopping = true
  say('Stopping …')
  await stopWadestone({ children, dataFolder: process.env.WADESTONE_DATA })
  say('Stopped. The data is kept.')
  process.exit(code)
}

process.on('SIGINT', () => void stop(0))
process.on('SIGTERM', () => void stop(0))

function printSignIns() {
  const file = join(runFolder(), 'demo-sign-ins.json')
  if (demo !== 'on' || !existsSync(file)) return
  say('\nExample sign-ins (invented people, passwords made for this database):')
  for (const { district, role, email, password } of JSON.parse(readFileSync(file, 'utf8'))) {
    say(`  ${role.padEnd(14)} ${email.padEnd(38)} ${password}   ${district}`)
  }
}

installNodePackages()
needDebianPackages('postgresql')
build()
try {
  const wantedPort = Number(process.env.PORT ?? 8460)
  const running = await startWadestone({ children, dataFolder: process.env.WADESTONE_DATA, demo, wantedPort })
  if (stopping) process.exit(0)
  say(`Wadestone is ready: ${running.address}`)
  printSignIns()
  say(`\nMail that Wadestone sends is caught here: ${running.mailPage}`)
  say(`Data: ${running.dataFolder}\nStop with Ctrl-C.`)
  const watch = setInterval(() => {
    if (!running.hasExited() || stopping) return
    clearInterval(watch)
    console.error(`The server stopped by itself. Its last words are in ${join(runFolder(), 'server.log')}.`)
    void stop(1)
  }, 500)
} catch (error) {
  await children.stopAll()
  giveUp(`Wadestone could not start. ${error.message}`)
}
