import { Problem } from 'shared'

/** Words that a guesser tries first, and the product's own name. */
const guessable = ['password', 'wadestone', 'letmein', 'qwerty', '1234567890', 'iloveyou', 'administrator']

const plain = (text: string): string => text.toLowerCase().replace(/[^\p{L}\p{N}]/gu, '')

/** Does the password still say enough when such a word is taken out of it? */
const leansOn = (password: string, word: string): boolean =>
  word.length >= 4 && plain(password).includes(word) && plain(password).replaceAll(word, '').length < 8

/** Length is checked by the schema; this refuses what is long and still easy. */
export function refuseWeakPassword(password: string, about: { name: string; email: string }): void {
  const own = [...about.name.split(/\s+/), about.email.split('@')[0] ?? ''].map(plain)
  const word = [...guessable, ...own].find((each) => leansOn(password, each))
  const isOneSign = new Set(password).size < 5
  if (word === undefined && !isOneSign) return
  const message =
    word === undefined
      ? 'This repeats a few signs over and over. Use a sentence you can remember.'
      : `This is little more than "${word}". Use a sentence you can remember.`
  throw new Problem('invalid-fields', { detail: message, fields: [{ pointer: '/newPassword', message }] })
}
