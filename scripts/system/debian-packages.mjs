import { spawnSync } from 'node:child_process'
import { existsSync, readdirSync } from 'node:fs'
import { giveUp, say } from './say.mjs'

const onPath = (program) => spawnSync('sh', ['-c', `command -v ${program}`]).status === 0

const hasPostgres = () =>
  existsSync('/usr/lib/postgresql') &&
  readdirSync('/usr/lib/postgresql').some((version) =>
    existsSync(`/usr/lib/postgresql/${version}/bin/initdb`),
  )

/** What the product and its tests need of Debian, and how to tell that it is there. */
const packages = {
  postgresql: hasPostgres,
  chromium: () => onPath('chromium'),
  qpdf: () => onPath('qpdf'),
  'poppler-utils': () => onPath('pdftotext'),
}

/** Installs the named Debian packages that are missing, or says which they are. */
export function needDebianPackages(...names) {
  const missing = names.filter((name) => !packages[name]())
  if (missing.length === 0) return
  const command = `apt-get install -y ${missing.join(' ')}`
  if (process.getuid?.() !== 0 || !onPath('apt-get')) {
    giveUp(`Missing on this machine: ${missing.join(', ')}. Install it as an administrator with: ${command}`)
  }
  say(`Installing from Debian's packages: ${missing.join(', ')} …`)
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' }
  spawnSync('apt-get', ['update', '-qq'], { env, stdio: 'inherit' })
  // Debian would make and start a cluster of its own; ours lives in docker-free-db.
  const { status } = spawnSync('apt-get', ['install', '-y', '-qq', ...missing], {
    env,
    stdio: ['ignore', 'ignore', 'inherit'],
  })
  if (status !== 0 || missing.some((name) => !packages[name]())) {
    giveUp(`Could not install ${missing.join(', ')}. Try by hand: ${command}`)
  }
}
