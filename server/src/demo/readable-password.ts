import { randomInt } from 'node:crypto'
import { words } from './data/words.js'

const wordCount = 4
const digitsBelow = 1_000_000

const anyWord = (): string => words[randomInt(words.length)] ?? ''

/** Four words and six digits, such as `copper-meadow-quill-otter-408113`: some 48 bits, behind a throttled sign-in. */
export function readablePassword(): string {
  const digits = String(randomInt(digitsBelow)).padStart(6, '0')
  return [...Array.from({ length: wordCount }, anyWord), digits].join('-')
}
