import type { DesignPartName } from 'shared'

/** As the packet's appendix names them. */
export const partWords: { readonly [part in DesignPartName]: string } = {
  herd: 'Herd and water',
  profile: 'Ramp',
  earthwork: 'Earthwork',
  rock: 'Rock',
  fabric: 'Fabric',
  approachPad: 'Approach pad',
  closingPanel: 'Closing panel',
  fence: 'Fence',
  runoff: 'Runoff',
  berm: 'Berm',
  pond: 'Pond',
  seeding: 'Seeding',
}

const otherWords: { readonly [name: string]: string } = {
  quantities: 'the bill of quantities',
  cost: 'the estimated cost',
}

/** What a part may wait for: another part, or a result of all parts. */
export const waitedForWords = (name: string): string =>
  name in partWords ? partWords[name as DesignPartName] : (otherWords[name] ?? name)
