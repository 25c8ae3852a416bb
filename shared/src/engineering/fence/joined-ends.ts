import type { RunLayout } from './run-layout.js'
import type { RunEnd } from './run-path.js'

export interface PlacedEnd extends RunEnd {
  layout: RunLayout
  runIndex: number
  side: 'start' | 'end'
}

/** Survey and drawing put two posts that are meant to be one up to half a foot apart. */
const SAME_PLACE_FT = 0.5

/**
 * Ends of runs grouped by place: those with the same label, or within half a foot of each other, directly or through
 * others, are one place.
 *
 * @returns one group per place, in the order in which its first end comes.
 * Common practice, no source.
 */
export function joinedEnds(layouts: readonly RunLayout[]): PlacedEnd[][] {
  const ends = layouts.flatMap((layout, runIndex): PlacedEnd[] => [
    { ...layout.path.start, layout, runIndex, side: 'start' },
    { ...layout.path.end, layout, runIndex, side: 'end' },
  ])
  return ends.reduce<PlacedEnd[][]>((places, end) => {
    const touched = places.filter((place) => place.some((other) => samePlace(end, other)))
    if (touched.length === 0) return [...places, [end]]
    const [first] = touched
    const merged = [...touched.flat(), end]
    return places.flatMap((place) => {
      if (place === first) return [merged]
      return touched.includes(place) ? [] : [place]
    })
  }, [])
}

function samePlace(a: RunEnd, b: RunEnd): boolean {
  if (a.label !== undefined && a.label === b.label) return true
  if (!a.point || !b.point) return false
  return Math.hypot(a.point.eastFt - b.point.eastFt, a.point.northFt - b.point.northFt) <= SAME_PLACE_FT
}
