import { spawn } from 'node:child_process'
import { createWriteStream } from 'node:fs'

/** Processes started here, stopped in the reverse order and never left running. */
export class Children {
  #running = []

  start(name, args, { env = {}, cwd, logFile, onExit, shows = false } = {}) {
    const child = spawn(process.execPath, args, {
      env: { ...process.env, ...env },
      cwd,
      stdio: shows ? ['ignore', 'inherit', 'inherit'] : ['ignore', 'pipe', 'pipe'],
      // A group of its own, so that Ctrl-C reaches it through us and in order.
      detached: true,
    })
    if (logFile) {
      const log = createWriteStream(logFile, { flags: 'a' })
      child.stdout.pipe(log)
      child.stderr.pipe(log)
    }
    const entry = { name, child, exited: new Promise((resolve) => child.once('exit', resolve)) }
    child.once('exit', (code) => {
      this.#running = this.#running.filter((other) => other !== entry)
      onExit?.(code)
    })
    this.#running.push(entry)
    return child
  }

  async stopAll(graceMs = 10_000) {
    for (const { child, exited } of [...this.#running].reverse()) {
      child.kill('SIGTERM')
      const timer = setTimeout(() => child.kill('SIGKILL'), graceMs)
      await exited
      clearTimeout(timer)
    }
  }
}
