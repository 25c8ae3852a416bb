import { isRefusedForGood, smtpErrorText } from './smtp-error.js'

const answered = (responseCode: number, response: string): Error =>
  Object.assign(new Error('Message failed'), { responseCode, response })

describe('the answer of a mail server', () => {
  it('ends the tries from 500 on, as RFC 5321 (October 2008), 4.2.1 has it', () => {
    expect(isRefusedForGood(answered(550, '550 No such mailbox'))).toBe(true)
    expect(isRefusedForGood(answered(451, '451 Try again later'))).toBe(false)
  })

  it('that never came is worth another try', () => {
    expect(isRefusedForGood(new Error('connect ECONNREFUSED'))).toBe(false)
  })

  it('is kept as one line without control characters', () => {
    expect(smtpErrorText(answered(550, '550 No\r\nsuch\u0000 mailbox'))).toBe('550 No such  mailbox')
    expect(smtpErrorText(new Error('x'.repeat(2000)))).toHaveLength(500)
  })
})
