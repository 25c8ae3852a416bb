import { createServer } from 'node:net'
import { say } from './say.mjs'

const tryPort = (port) =>
  new Promise((resolve) => {
    const probe = createServer()
    probe.once('error', () => resolve(null))
    probe.listen(port, '127.0.0.1', () => {
      const taken = probe.address().port
      probe.close(() => resolve(taken))
    })
  })

/** The wanted port of loopback, or any free one when it is taken. */
export async function portFor(what, wanted) {
  const port = await tryPort(wanted)
  if (port !== null) return port
  const other = await tryPort(0)
  say(`Port ${wanted} is taken, ${what} uses ${other}.`)
  return other
}
