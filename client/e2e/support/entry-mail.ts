import type { Mailbox } from './mailbox'

/** The newest mailed link to a packet, as it stands in the mail. */
export async function mailedLink(mailbox: Mailbox): Promise<string> {
  const { text = '' } = await mailbox.next('a link', (mail) => /\/enter#t=/.test(mail.text ?? ''))
  return /https?:\/\/\S+\/enter#t=[\w-]+/.exec(text)?.[0] ?? ''
}

/** The newest mailed code of six digits. */
export async function mailedCode(mailbox: Mailbox): Promise<string> {
  const { text = '' } = await mailbox.next('a code', (mail) => /^Your code is \d{6}$/m.test(mail.text ?? ''))
  return /\b\d{6}\b/.exec(text)?.[0] ?? ''
}
