import type { FencePlan } from 'shared'

/** East and north in ft from where the axis of the ramp meets the edge of the water. */
export type Pair = readonly [number, number]

export const pointsAt = (pairs: readonly Pair[]) => pairs.map(([eastFt, northFt]) => ({ eastFt, northFt }))

export interface RingFence {
  /** From the west post of the lane round the water to its east post, without these two posts. */
  round: readonly Pair[]
  rampWidthFt: number
  /** Where the lane begins, and where its electric fence hands over to the closing panel. */
  laneFromFt: number
  panelFromFt: number
  panelToFt: number
  gateWidthFt: number
  laneAreaFt2: number
}

const electric = {
  fence: 'electric',
  energized: true,
  inWater: false,
  wires: 3,
  hotWires: 2,
  postSpacingFt: 25,
  wireKind: 'high-tensile',
} as const

const smoothInWater = {
  fence: 'smooth',
  energized: false,
  inWater: true,
  wires: 3,
  hotWires: 0,
  postSpacingFt: 10,
  wireKind: 'barbless',
} as const

/** The water fenced off, a lane down to the ramp, and a panel round its toe: one foot clear of the rock. */
export function ringFence(given: RingFence): FencePlan {
  const { round, laneFromFt, panelFromFt, panelToFt, laneAreaFt2 } = given
  const side = given.rampWidthFt / 2 + 1
  const ring: Pair[] = [[-side, laneFromFt], ...round, [side, laneFromFt]]
  const panel: Pair[] = [
    [-side, panelFromFt],
    [-side, panelToFt],
    [side, panelToFt],
    [side, panelFromFt],
  ]
  const lane = (name: string, eastFt: number) => {
    const path = pointsAt([
      [eastFt, laneFromFt],
      [eastFt, panelFromFt],
    ])
    return { ...electric, name, role: 'lane' as const, path: { points: path }, gates: [] }
  }
  const gates = [{ widthFt: given.gateWidthFt }]
  return {
    runs: [
      { ...electric, name: 'exclusion', role: 'exclusion', path: { points: pointsAt(ring) }, gates },
      lane('lane west', -side),
      lane('lane east', side),
      {
        ...smoothInWater,
        name: 'closing panel',
        role: 'closing',
        path: { points: pointsAt(panel) },
        gates: [],
      },
    ],
    cornerAngleDeg: 20,
    maxPullFt: 660,
    rollLengthFt: { 'high-tensile': 4000, barbless: 1320 },
    tieOffFt: 2,
    wastePercent: 5,
    energizerRule: 'fence-mile',
    groundRodLengthFt: 8,
    minimumGroundRods: 3,
    laneAreaFt2,
  }
}
