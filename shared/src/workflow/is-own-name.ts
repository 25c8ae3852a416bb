/** Letters alone, without case and accents, so that "JOSÉ" and "Jose" are one. */
const wordsOf = (name: string): string[] =>
  name
    .normalize('NFD')
    .replace(/\p{M}/gu, '')
    .toLowerCase()
    .split(/[^\p{L}\p{N}]+/u)
    .filter((word) => word.length > 1)

/**
 * Is what a signer typed the signer's own name? People leave a middle name out or add one, so one word in common is
 * enough; another person's name has none. Two of one family who share a surname are told apart by how they came in.
 */
export function isOwnName(typed: string, known: string): boolean {
  const own = wordsOf(known)
  return wordsOf(typed).some((word) => own.includes(word))
}
