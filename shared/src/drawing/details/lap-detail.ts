import type { FabricDirection } from '../../engineering/design/part-shapes.js'
import { feetAndInches } from '../../format/feet-and-inches.js'
import { dimension } from '../marks/dimension.js'
import { pens, typeMm } from '../pens.js'
import { polygon, polyline, textAt } from '../shape-makers.js'
import type { Box, Point, Shape, View } from '../shapes.js'
import type { SheetModel } from '../sheet-model.js'
import { ringOf } from '../geometry/boxes.js'

type Fabric = NonNullable<SheetModel['fabric']>

const small = { sizeMm: typeMm.small } as const

/** How strips lap, dry and under water, and in what order they lie on the ramp. */
export function lapDetail(fabric: Fabric, view: View): Shape[] {
  const { plan, value } = fabric
  const { left, right, top, bottom } = view.clip
  const y = top + 14
  const width = (right - left) / 2 - 6
  const dry = { left: left + 1, y, widthMm: width, lapMm: 22, label: `lap ${feetAndInches(plan.lapDryFt)}` }
  const wet = {
    left: left + width + 11,
    y,
    widthMm: width,
    lapMm: 30,
    label: `lap ${feetAndInches(plan.lapWetFt)}`,
  }
  const box = { left: left + 1, right: right - 1, top: top + 33, bottom: bottom - 10 }
  const direction = value[value.recommended]
  const strips = direction.strips === 1 ? 'one strip' : `${direction.strips} strips`
  return [
    ...lap({ ...dry, name: 'joint above water' }),
    ...lap({ ...wet, name: 'joint under water' }),
    textAt('hill', { x: box.left, y: box.top - 1.6 }, { ...small, tone: 'mute' }),
    textAt(
      `${strips} laid ${value.recommended} the ramp, each ${feetAndInches(direction.stripLengthFt)} long`,
      { x: (box.left + box.right) / 2, y: box.top - 1.6 },
      { ...small, align: 'center' },
    ),
    textAt('water', { x: box.right, y: box.top - 1.6 }, { ...small, tone: 'mute', align: 'right' }),
    ...(value.recommended === 'across'
      ? acrossStrips(direction, { fabric, box })
      : alongStrips(direction, { fabric, box })),
    textAt(
      'Laid from the toe up: the strip nearer the hill lies on top. Shaded: laps.',
      { x: box.left, y: bottom - 3 },
      small,
    ),
  ]
}

interface Lap {
  left: number
  y: number
  widthMm: number
  lapMm: number
  label: string
  name: string
}

function lap({ left, y, widthMm, lapMm, label, name }: Lap): Shape[] {
  const middle = left + widthMm / 2
  const from = middle - lapMm / 2
  const to = middle + lapMm / 2
  const upper: Point[] = [
    { x: left, y: y - 1.2 },
    { x: to, y: y - 1.2 },
  ]
  const lower: Point[] = [
    { x: from, y: y + 1 },
    { x: left + widthMm, y: y + 1 },
  ]
  const ground = { left, right: left + widthMm, top: y + 1.7, bottom: y + 7 }
  return [
    polygon(ringOf(ground), { fill: 'earthTint' }),
    polyline(upper, pens.fabric),
    polyline(lower, pens.fabric),
    ...dimension({
      from: { x: from, y: y - 7 },
      to: { x: to, y: y - 7 },
      label,
      witness: [
        { x: from, y: y + 0.4 },
        { x: to, y: y - 1.8 },
      ],
    }),
    textAt(name, { x: middle, y: y + 5.4 }, { align: 'center', ...small }),
  ]
}

interface Layout {
  fabric: Fabric
  box: Box
}

/** Strips square to the ramp, numbered in the order of laying from the toe; laps to scale along the ramp. */
function acrossStrips({ strips, joints }: FabricDirection, { fabric, box }: Layout): Shape[] {
  const { rollWidthFt } = fabric.plan
  const covered = strips * rollWidthFt - joints.reduce((sum, joint) => sum + joint.lapFt, 0)
  const mmPerFt = (box.right - box.left) / covered
  const starts = joints.reduce<number[]>(
    (all, joint) => [...all, (all.at(-1) ?? 0) + rollWidthFt - joint.lapFt],
    [0],
  )
  const xAt = (fromToeFt: number) => box.right - fromToeFt * mmPerFt
  const laps = joints.map((joint, index) => {
    const start = starts[index + 1] ?? 0
    return polygon(ringOf({ ...box, left: xAt(start + joint.lapFt), right: xAt(start) }), {
      fill: 'stoneLight',
    })
  })
  const outlines = starts.map((start) =>
    polygon(ringOf({ ...box, left: xAt(start + rollWidthFt), right: xAt(start) }), { stroke: pens.outline }),
  )
  const numbers = starts.map((start, index) =>
    textAt(
      String(index + 1),
      { x: xAt(start + rollWidthFt / 2), y: (box.top + box.bottom) / 2 + 1.3 },
      { align: 'center', weight: 'bold' },
    ),
  )
  return [...laps, ...outlines, ...numbers]
}

/** Strips that run down the ramp, side by side. */
function alongStrips({ strips }: FabricDirection, { fabric, box }: Layout): Shape[] {
  const { rollWidthFt, lapWetFt } = fabric.plan
  const covered = strips * rollWidthFt - (strips - 1) * lapWetFt
  const mmPerFt = (box.bottom - box.top) / covered
  const yAt = (ft: number) => box.top + ft * mmPerFt
  const starts = Array.from({ length: strips }, (_, index) => index * (rollWidthFt - lapWetFt))
  const laps = starts
    .slice(1)
    .map((start) =>
      polygon(ringOf({ ...box, top: yAt(start), bottom: yAt(start + lapWetFt) }), { fill: 'stoneLight' }),
    )
  const outlines = starts.map((start) =>
    polygon(ringOf({ ...box, top: yAt(start), bottom: yAt(start + rollWidthFt) }), { stroke: pens.outline }),
  )
  const numbers = starts.map((start, index) =>
    textAt(
      String(index + 1),
      { x: box.left + 8, y: yAt(start + rollWidthFt / 2) + 1.3 },
      { align: 'center', weight: 'bold' },
    ),
  )
  return [...laps, ...outlines, ...numbers]
}
