import { readdirSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { simpleParser, type ParsedMail } from 'mailparser'
import { runFolder } from './sign-ins'

const folder = join(runFolder, 'mail')
const names = () =>
  readdirSync(folder)
    .filter((name) => name.endsWith('.eml'))
    .sort()

/** A person's mailbox as the local mail server keeps it. Each message is given out once. */
export class Mailbox {
  readonly #seen = new Set(names())

  constructor(readonly address: string) {}

  /** Waits for the next message to this address that fits. */
  async next(what: string, fits: (mail: ParsedMail) => boolean): Promise<ParsedMail> {
    for (let tries = 0; tries < 300; tries += 1) {
      for (const name of this.#unseen()) {
        const mail = await this.#open(name)
        if (mail !== null && fits(mail)) return mail
      }
      await new Promise((resolve) => setTimeout(resolve, 100))
    }
    throw new Error(`${this.address} got no mail with ${what}.`)
  }

  /** What has come since and was not given out. */
  async rest(): Promise<ParsedMail[]> {
    const mails = []
    for (const name of this.#unseen()) mails.push(await this.#open(name))
    return mails.filter((mail) => mail !== null)
  }

  #unseen = () => names().filter((name) => !this.#seen.has(name))

  /** Null when it is for somebody else. */
  async #open(name: string): Promise<ParsedMail | null> {
    this.#seen.add(name)
    const mail = await simpleParser(readFileSync(join(folder, name)))
    const to = [mail.to ?? []].flat().flatMap(({ value }) => value)
    return to.some(({ address }) => address === this.address) ? mail : null
  }
}
