import type { EarthVolumes } from '../design/ramp-shapes.js'

/** Volumes of several stretches together. */
export function addVolumes(parts: readonly EarthVolumes[]): EarthVolumes {
  const total = (pick: (part: EarthVolumes) => number) => parts.reduce((sum, part) => sum + pick(part), 0)
  return {
    cutYd3: total((part) => part.cutYd3),
    fillYd3: total((part) => part.fillYd3),
    wetCutYd3: total((part) => part.wetCutYd3),
    dryCutYd3: total((part) => part.dryCutYd3),
    wetFillYd3: total((part) => part.wetFillYd3),
    edgeBackfillYd3: total((part) => part.edgeBackfillYd3),
  }
}
