/** The parts of a design result, in the order in which they are worked out and shown. */
export const designParts = [
  'herd',
  'profile',
  'earthwork',
  'rock',
  'fabric',
  'approachPad',
  'closingPanel',
  'fence',
  'runoff',
  'berm',
  'pond',
  'seeding',
] as const

export type DesignPartName = (typeof designParts)[number]
