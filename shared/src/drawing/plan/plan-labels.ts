import { feetAndInches } from '../../format/feet-and-inches.js'
import { formatRatio } from '../../format/format-ratio.js'
import { numberText } from '../../format/number-text.js'
import { backedText } from '../marks/backed-text.js'
import type { Name } from '../marks/place-names.js'
import { pens, typeMm } from '../pens.js'
import { textAt } from '../shape-makers.js'
import type { Shape, Tone, View } from '../shapes.js'
import type { SheetModel } from '../sheet-model.js'
import { stationLabel } from '../station-label.js'
import { toPaper } from '../view.js'
import { onAxis, type PlanAxis } from './plan-axis.js'
import { bermFootprint } from './plan-works.js'

/** What the works are called, each with its deciding figure. */
export function workNames(model: SheetModel, axis: PlanAxis, view: View): Name[] {
  const { profile, ramp, pad, berm, closing } = model
  const half = ramp.widthFt / 2
  const foot = bermFootprint(model)
  const name = (text: string, stationFt: number, leftFt: number, ground: Tone): Name => {
    const target = toPaper(view, onAxis(axis, stationFt, leftFt))
    const isRight = target.x >= toPaper(view, onAxis(axis, stationFt)).x
    return { target, text, ground, sides: isRight ? ['right', 'left'] : ['left', 'right'] }
  }
  const names = [
    name(
      `ramp ${feetAndInches(ramp.widthFt)} wide, ${formatRatio(ramp.gradeRunPerRise)}`,
      profile.topStationFt + profile.runFt * 0.55,
      half,
      'waterTint',
    ),
  ]
  if (pad) {
    const size = `pad ${feetAndInches(pad.lengthFt)} × ${feetAndInches(pad.widthFt)}`
    names.push(name(size, (pad.fromStationFt + pad.toStationFt) / 2, pad.widthFt / 2, 'paper'))
  }
  if (berm && foot) {
    const outlet = berm.plan.falls === 'right' ? -foot.right : foot.left
    names.push(
      name(`berm ${feetAndInches(berm.value.lengthFt)} long`, foot.to, foot.left * 0.6, 'paper'),
      name(`outlet: ${berm.plan.outletSurface}`, foot.from - 2.5, outlet * 0.9, 'paper'),
    )
  }
  if (closing)
    names.push(name('closing panel, no current', closing.stationFt, half + closing.plan.clearFt, 'waterTint'))
  return names
}

/** Stations written along the ramp's left edge. */
export function stationTicks(model: SheetModel, axis: PlanAxis, view: View): Shape[] {
  const { profile } = model
  const stations = [
    profile.topStationFt,
    profile.fullPoolEdgeStationFt,
    profile.lowWaterEdgeStationFt,
    profile.toeStationFt,
  ]
  const half = model.ramp.widthFt / 2
  return stations.flatMap((station): Shape[] => {
    const edge = toPaper(view, onAxis(axis, station, -half))
    const out = toPaper(view, onAxis(axis, station, -half - 2 / view.horizontalMmPerFt))
    const left = toPaper(view, onAxis(axis, station, half))
    const isRight = out.x >= edge.x
    const isWet = station > profile.fullPoolEdgeStationFt
    const at = { x: out.x + (isRight ? 0.8 : -0.8), y: out.y + (isWet ? 1 : -0.7) }
    return [
      { kind: 'polyline', lines: [[left, out]], stroke: pens.fine },
      ...backedText(
        textAt(stationLabel(station), at, { sizeMm: typeMm.small, align: isRight ? 'left' : 'right' }),
        isWet ? 'waterTint' : 'paper',
      ),
    ]
  })
}

/** The fence runs by name and length; those without a line on the map say so. */
export function fenceWords(model: SheetModel): string[] {
  return (model.fence?.plan.runs ?? []).map((run, index) => {
    const length = model.fence?.value?.runs[index]?.lengthFt
    const gates = run.gates.map((gate) => `${numberText(gate.widthFt)} ft gate`)
    const facts = [
      length === undefined ? '' : `${numberText(length, 1)} ft`,
      `${run.wires} wires`,
      run.energized ? 'energized' : 'not energized',
      ...gates,
      'points' in run.path ? '' : 'not drawn, length only',
    ]
    return `${run.name}: ${facts.filter(Boolean).join(', ')}`
  })
}
