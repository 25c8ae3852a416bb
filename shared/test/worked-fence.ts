import type { FencePlan } from '../src/schemas/fence-plan.js'

const points = (pairs: readonly (readonly [number, number])[]) =>
  pairs.map(([eastFt, northFt]) => ({ eastFt, northFt }))

/** Eight corners, 64,800 ft². */
export const workedOutline = points([
  [-90, 0],
  [90, 0],
  [150, -60],
  [150, -180],
  [90, -240],
  [-90, -240],
  [-150, -180],
  [-150, -60],
])

const electric = {
  fence: 'electric',
  energized: true,
  inWater: false,
  wires: 3,
  hotWires: 2,
  postSpacingFt: 25,
  wireKind: 'high-tensile',
} as const

/** Invented; its figures were worked out apart from this code. */
export const workedFence: FencePlan = {
  runs: [
    {
      ...electric,
      name: 'exclusion',
      role: 'exclusion',
      path: {
        points: points([
          [-10, 30],
          [-105, 30],
          [-180, -45],
          [-180, -195],
          [-105, -270],
          [105, -270],
          [180, -195],
          [180, -45],
          [105, 30],
          [10, 30],
        ]),
      },
      gates: [{ widthFt: 14 }],
    },
    ...([-10, 10] as const).map((eastFt) => ({
      ...electric,
      name: eastFt < 0 ? 'lane west' : 'lane east',
      role: 'lane' as const,
      path: {
        points: points([
          [eastFt, 30],
          [eastFt, -7.35],
        ]),
      },
      gates: [],
    })),
    {
      name: 'closing panel',
      role: 'closing',
      path: {
        points: points([
          [-10, -7.35],
          [-10, -54.35],
          [10, -54.35],
          [10, -7.35],
        ]),
      },
      fence: 'smooth',
      energized: false,
      inWater: true,
      wires: 3,
      hotWires: 0,
      postSpacingFt: 10,
      gates: [],
      wireKind: 'barbless',
    },
  ],
  cornerAngleDeg: 20,
  maxPullFt: 660,
  rollLengthFt: { 'high-tensile': 4000, barbless: 1320 },
  wastePercent: 5,
  energizerRule: 'fence-mile',
  groundRodLengthFt: 8,
  minimumGroundRods: 3,
  laneAreaFt2: 600,
}
