import type { Tone } from 'shared'

export const POINTS_PER_MM = 72 / 25.4

/** Letter paper upright, in millimetres, for the pages of text. */
export const textPage = {
  widthMm: 215.9,
  heightMm: 279.4,
  leftMm: 21,
  rightMm: 21,
  topMm: 25,
  bottomMm: 24,
} as const

export const contentWidthMm = textPage.widthMm - textPage.leftMm - textPage.rightMm

/** Type sizes and line heights in millimetres. */
export const type = {
  title: { sizeMm: 7.2, lineMm: 8.8 },
  lead: { sizeMm: 4.6, lineMm: 6.4 },
  heading: { sizeMm: 4.7, lineMm: 6 },
  text: { sizeMm: 3.6, lineMm: 4.9 },
  small: { sizeMm: 3.2, lineMm: 4.3 },
  figure: { sizeMm: 6.6, lineMm: 7.4 },
  furniture: { sizeMm: 3, lineMm: 4 },
} as const

export const gaps = { heading: 5.6, block: 2.8, row: 1.1, item: 0.9 } as const

/** Inks of the packet. Stone and soil are fills and lines, never text. */
export const inks: { [tone in Tone]: string } = {
  ink: '#22302B',
  mute: '#566059',
  hairline: '#C9CEC4',
  paper: '#FFFFFF',
  water: '#2B6F86',
  waterTint: '#E3EEF1',
  earthTint: '#F3EBDD',
  earthFill: '#DFC3A2',
  soil: '#A5713F',
  stone: '#A79E90',
  stoneLight: '#D6D0C5',
  stoneDark: '#6F675C',
  grass: '#4F6A2E',
  grassTint: '#EAF0DF',
  signal: '#B3261E',
}
