const longest = 500

/** The mail server's own answer, when it gave one. */
const answerCode = (error: Error): number | null =>
  'responseCode' in error && typeof error.responseCode === 'number' ? error.responseCode : null

/** SMTP says with a code of 500 and above that a message will not be taken, now or later (RFC 5321, 4.2.1). */
export const isRefusedForGood = (error: Error): boolean => (answerCode(error) ?? 0) >= 500

/** What the office reads in the mail log. */
export function smtpErrorText(error: Error): string {
  const said = 'response' in error && typeof error.response === 'string' ? error.response : error.message
  return said.replace(/\p{Cc}+/gu, ' ').slice(0, longest)
}
