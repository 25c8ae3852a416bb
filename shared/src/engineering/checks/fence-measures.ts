import type { FencePlan } from '../../schemas/fence-plan.js'
import { entersOutline } from './enters-outline.js'
import { openFenceEnds } from './open-fence-ends.js'
import { unknown, type MeasureTable } from './measure.js'
import { FT2_PER_ACRE } from '../unit-factors.js'

/** Figures of fence and closing panel. */
export const fenceMeasures: MeasureTable = {
  setback: ({ part }) => {
    const fence = part('fence')
    if (!fence) return undefined
    return fence.setbackFt === undefined
      ? unknown('fence or water is entered without coordinates')
      : { actual: fence.setbackFt }
  },
  'energized-in-water': ({ input }) =>
    input.fence && { actual: !input.fence.runs.some(({ inWater, energized }) => inWater && energized) },
  'fence-in-flood': ({ input }) => {
    if (!input.fence || !input.site) return undefined
    const { waterOutline } = input.site
    const paths = energizedPaths(input.fence)
    if (!waterOutline || paths === undefined) return unknown('fence or water is entered without coordinates')
    return { actual: !paths.some((points) => entersOutline({ points, outline: waterOutline })) }
  },
  'electric-and-barbed': ({ input }) =>
    input.fence && {
      actual: !input.fence.runs.some(({ energized, fence }) => energized && fence === 'barbed'),
    },
  'fence-closes': ({ input }) => {
    if (!input.fence) return undefined
    const open = openFenceEnds(input.fence)
    if (open === undefined)
      return unknown('a run is entered without coordinates and without names of its ends')
    return { actual: open.length === 0, ...(open.length > 0 ? { note: `open at ${open.join(', ')}` } : {}) }
  },
  'ground-rods': ({ part }) => {
    const fence = part('fence')
    if (!fence) return undefined
    return fence.energizer
      ? { actual: fence.energizer.rodFt, limit: fence.energizer.rodFtByRule }
      : unknown('no run is energized')
  },
  'gate-width': ({ input }) => {
    if (!input.fence) return undefined
    const widths = input.fence.runs.flatMap(({ gates }) => gates.map(({ widthFt }) => widthFt))
    return widths.length === 0 ? unknown('no gate in the fence') : { actual: Math.min(...widths) }
  },
  'depth-at-closing-panel': ({ part }) => {
    const panel = part('closingPanel')
    if (panel === undefined) return undefined
    return panel === null ? unknown('no closing panel') : { actual: panel.deepestWaterFt }
  },
  'habitat-area': ({ part }) => {
    const fence = part('fence')
    if (!fence) return undefined
    return fence.habitatAreaFt2 === undefined
      ? unknown('fence or water is entered without coordinates')
      : { actual: fence.habitatAreaFt2 / FT2_PER_ACRE }
  },
}

/** Undefined when one of the energized runs has no coordinates. */
function energizedPaths({ runs }: FencePlan) {
  const paths = runs
    .filter(({ energized }) => energized)
    .map(({ path }) => ('points' in path ? path.points : undefined))
  return paths.every((points) => points !== undefined)
    ? paths.filter((points) => points !== undefined)
    : undefined
}
