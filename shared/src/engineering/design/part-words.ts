import type { DesignPartName } from './design-parts.js'

/** What each part of a result is called, on screen as in the packet's appendix. */
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
