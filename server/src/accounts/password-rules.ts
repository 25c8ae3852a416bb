import { Problem } from 'shared'

/** Words that a guesser tries first, and the product's own name. */
const guessable = ['password', 'wadestone', 'letmein', 'qwerty', '1234567890', 'iloveyou', 'administrator']

const plain = (text: string): string => text.toLowerCase().replace(/[^\p{L}\p{N}]/gu, '')

/** The easy words of a password, when it no longer says enough once all of them are taken out. */
function leansOn(password: string, words: readonly string[]): string[] {
  const text = plain(password)
  const easy = words.filter((word) => word.length >= 4 && text.includes(word))
  const rest = easy.reduce((left, word) => left.replaceAll(word, ''), text)
  return rest.length < 8 ? easy : []
}

/** Length is checked by the schema; this refuses what is long and still easy. */
export function refuseWeakPassword(password: string, about: { name: string; email: string }): void {
  const own = [...about.name.split(/\s+/), about.email.split('@')[0] ?? ''].map(plain)
  const [word] = leansOn(password, [...guessable, ...own])
  const isOneSign = new Set(password).size < 5
  if (word === undefined && !isOneSign) return
  const message =
    word === undefined
      ? 'This repeats a few signs over and over. Use a sentence you can remember.'
      : `This is little more than "${word}". Use a sentence you can remember.`
  throw new Problem('invalid-fields', { detail: message, fields: [{ pointer: '/newPassword', message }] })
}
