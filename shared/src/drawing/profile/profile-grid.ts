import { pens, typeMm } from '../pens.js'
import { polyline, textAt } from '../shape-makers.js'
import type { Shape, View } from '../shapes.js'
import { toGround, toPaper } from '../view.js'
import { numberText } from '../../format/number-text.js'

const steps = [0.5, 1, 2, 5, 10, 20, 50, 100]
const LEAST_GAP_MM = { across: 15, up: 6.5 }

const ticks = (from: number, to: number, step: number): number[] => {
  const first = Math.ceil(from / step - 1e-9)
  const count = Math.floor(to / step + 1e-9) - first + 1
  return Array.from({ length: Math.max(0, count) }, (_, index) => (first + index) * step)
}

const stepFor = (mmPerFt: number, gapMm: number) => steps.find((step) => step * mmPerFt >= gapMm) ?? 100

/** Hairlines at round stations and elevations, with elevations written at both ends. */
export function profileGrid(view: View): { lines: Shape[]; labels: Shape[] } {
  const { clip } = view
  const low = toGround(view, { x: clip.left, y: clip.bottom })
  const high = toGround(view, { x: clip.right, y: clip.top })
  const stations = ticks(low.x, high.x, stepFor(view.horizontalMmPerFt, LEAST_GAP_MM.across))
  const upStep = stepFor(view.verticalMmPerFt, LEAST_GAP_MM.up)
  const levels = ticks(low.y, high.y, upStep)
  const yOf = (elevation: number) => toPaper(view, { x: 0, y: elevation }).y
  const xOf = (station: number) => toPaper(view, { x: station, y: 0 }).x
  const places = upStep < 1 ? 1 : 0
  return {
    lines: [
      ...levels.map((e) =>
        polyline(
          [
            { x: clip.left, y: yOf(e) },
            { x: clip.right, y: yOf(e) },
          ],
          pens.grid,
        ),
      ),
      ...stations.map((s) =>
        polyline(
          [
            { x: xOf(s), y: clip.top },
            { x: xOf(s), y: clip.bottom },
          ],
          pens.grid,
        ),
      ),
    ],
    labels: levels
      .filter((e) => yOf(e) < clip.bottom - 1 && yOf(e) > clip.top + 2)
      .flatMap((e) => [
        textAt(
          numberText(e, places),
          { x: clip.left - 2, y: yOf(e) + 1.3 },
          { align: 'right', sizeMm: typeMm.small },
        ),
        textAt(numberText(e, places), { x: clip.right + 2, y: yOf(e) + 1.3 }, { sizeMm: typeMm.small }),
      ]),
  }
}
