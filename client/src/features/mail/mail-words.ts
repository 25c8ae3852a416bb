import type { MailView } from 'shared'

const times = (count: number): string => (count === 1 ? 'once' : `${count} times`)

const said = (lastError: string | null): string =>
  lastError === null ? '' : ` The mail server said: ${lastError}`

/** What became of a message, in a sentence; null when there is nothing to add to its state. */
export function mailSentence({ status, attempts, lastError }: MailView): string | null {
  if (status === 'failed') {
    return `It could not be delivered; it was tried ${times(attempts)}.${said(lastError)}`
  }
  if (status === 'waiting' && lastError !== null) {
    return `It was tried ${times(attempts)} and will be tried again.${said(lastError)}`
  }
  return null
}
