import type { DesignPartName } from 'shared'

export type ResultKey = DesignPartName | 'quantities' | 'cost' | 'funding'

/** What each part of a result is called where one waits for another. */
export const resultWords: Record<ResultKey, string> = {
  herd: 'the herd',
  profile: 'the ramp',
  earthwork: 'the earthwork',
  rock: 'the rock',
  fabric: 'the fabric',
  approachPad: 'the approach pad',
  closingPanel: 'the closing panel',
  fence: 'the fence',
  runoff: 'the runoff',
  berm: 'the berm',
  pond: 'the pond',
  seeding: 'the seeding',
  quantities: 'the quantities',
  cost: 'the cost',
  funding: 'the funding',
}

/** Names that a formula uses for what it waits for; a name that has no words is shown as it is. */
export const waitingWords = (names: readonly string[]): string =>
  names.map((name) => (name in resultWords ? resultWords[name as ResultKey] : name)).join(', ')
