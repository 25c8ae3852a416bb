import { execFileSync } from 'node:child_process'
import { join } from 'node:path'
import { root } from './places.mjs'

const script = join(root, 'docker-free-db', 'db.sh')

function db(command, dataFolder) {
  const env = dataFolder ? { ...process.env, WADESTONE_DATA: dataFolder } : process.env
  return execFileSync('bash', [script, command], {
    env,
    encoding: 'utf8',
    stdio: ['ignore', 'pipe', 'inherit'],
  }).trim()
}

/** Starts the cluster and returns where it keeps its data and how its owner reaches it. */
export function startDatabase(dataFolder) {
  const ownerUrl = db('start', dataFolder).split('\n').at(-1)
  return { ownerUrl, dataFolder: db('folder', dataFolder) }
}

export const stopDatabase = (dataFolder) => db('stop', dataFolder)

/** The same database as another role. */
export function withRole(ownerUrl, role, password) {
  const url = new URL(ownerUrl)
  url.username = role
  url.password = password
  return url.href
}
