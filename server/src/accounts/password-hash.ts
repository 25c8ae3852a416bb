import { createHmac } from 'node:crypto'
import { compare, hash } from 'bcryptjs'

const rounds = 11

/** A hash nothing fits, for comparing when there is no account: an unknown e-mail must take as long as a known one. */
const hashOfNobody = '$2b$11$spnQ82XWGkSSth9eAgJGaeDdggi0MnBPbb9ioVNJETTGRF1Ubx.se'

/** bcrypt reads 72 bytes and stops; the digest before it makes every character of a long password count. */
const digest = (password: string, pepper: string): string =>
  createHmac('sha384', pepper).update(password.normalize('NFKC'), 'utf8').digest('base64')

export const hashPassword = (password: string, pepper: string): Promise<string> =>
  hash(digest(password, pepper), rounds)

export async function isPassword(
  password: string,
  passwordHash: string | null,
  pepper: string,
): Promise<boolean> {
  const fits = await compare(digest(password, pepper), passwordHash ?? hashOfNobody)
  return fits && passwordHash !== null
}
