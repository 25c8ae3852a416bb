import { partWords, type DesignPartName } from 'shared'

const otherWords: { readonly [name: string]: string } = {
  quantities: 'the bill of quantities',
  cost: 'the estimated cost',
}

/** What a part may wait for: another part, or a result of all parts. */
export const waitedForWords = (name: string): string =>
  name in partWords ? partWords[name as DesignPartName] : (otherWords[name] ?? name)
