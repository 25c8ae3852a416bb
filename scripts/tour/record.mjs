import { createHash } from 'node:crypto'
import { mkdirSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { root } from '../system/places.mjs'

export const sha256 = (bytes) => createHash('sha256').update(bytes).digest('hex')

/** What the tour saw: printed line by line, and written to the folder `out` at the end. */
export class Record {
  #states = []
  #packets = []

  constructor() {
    this.folder = process.env.TOUR_OUT ?? join(root, 'out')
    mkdirSync(this.folder, { recursive: true })
  }

  step(who, what, figure) {
    const number = String(this.#states.length + 1).padStart(2)
    console.log(`${number}. ${who.padEnd(13)} ${what}${figure ? `: ${figure}` : ''}`)
    this.#states.push({ who, what, figure: figure ?? null })
  }

  /** Notes the state the server reports, and stops the tour when it is not the promised one. */
  state(job, promised) {
    this.#states.at(-1).state = job.state
    if (job.state !== promised)
      throw new Error(`The job should be ${promised}, the server says ${job.state}.`)
  }

  packet({ id, kind, revision, sha256: hash }) {
    this.#packets.push({ id, kind, revision, sha256: hash })
  }

  file(name, bytes) {
    writeFileSync(join(this.folder, name), bytes)
  }

  result(rest) {
    const result = { ...rest, steps: this.#states, packets: this.#packets }
    this.file('result.json', `${JSON.stringify(result, null, 2)}\n`)
  }
}

/** Stops the tour at the first thing that is not as promised. */
export function promise(holds, sentence) {
  if (!holds) throw new Error(sentence)
}
