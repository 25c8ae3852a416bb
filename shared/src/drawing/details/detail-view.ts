import type { Box, View } from '../shapes.js'

/** A view for a figure that is only a sketch: it has a clip but no scale, and says so. */
export const sketchView = (key: string, title: string, clip: Box): View => ({
  key,
  title,
  clip,
  scaleNote: 'not to scale',
  horizontalMmPerFt: 0,
  verticalMmPerFt: 0,
  exaggeration: 1,
  originFt: { x: 0, y: 0 },
  originMm: { x: (clip.left + clip.right) / 2, y: (clip.top + clip.bottom) / 2 },
})
