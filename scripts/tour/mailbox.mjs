import { readdirSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { simpleParser } from 'mailparser'
import { runFolder } from '../system/places.mjs'

const folder = () => join(runFolder(), 'mail')
const names = () =>
  readdirSync(folder())
    .filter((name) => name.endsWith('.eml'))
    .sort()

/** A person's mailbox as the local mail server keeps it. Reads each message once. */
export class Mailbox {
  #seen

  constructor(address) {
    this.address = address
    this.#seen = new Set(names())
  }

  /** Waits for the next message whose subject fits. */
  async next(what, fits, seconds = 60) {
    for (let tries = 0; tries < seconds * 10; tries += 1) {
      for (const name of names().filter((each) => !this.#seen.has(each))) {
        const bytes = readFileSync(join(folder(), name))
        const mail = await simpleParser(bytes)
        const isMine = mail.to?.value.some(({ address }) => address === this.address)
        this.#seen.add(name)
        if (isMine && fits(mail)) return { mail, bytes }
      }
      await new Promise((resolve) => setTimeout(resolve, 100))
    }
    throw new Error(`${this.address} got no mail with ${what} within ${seconds} seconds.`)
  }
}
