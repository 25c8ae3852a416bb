import type { PlanPoint } from '../survey/signed-area.js'
import type { FenceRun, FenceTakeOffInput } from './fence-input.js'

export const at = (eastFt: number, northFt: number): PlanPoint => ({ eastFt, northFt })

/** One plain barbed run, for the counts that need no more. */
export const straightRun: FenceRun = {
  name: 'a',
  role: 'other',
  path: { lengthFt: 200 },
  fence: 'barbed',
  energized: false,
  inWater: false,
  wires: 4,
  postSpacingFt: 25,
  gates: [],
  wireKind: 'barbed',
}

const rules: Omit<FenceTakeOffInput, 'runs'> = {
  cornerAngleDeg: 20,
  maxPullFt: 660,
  rollLengthFt: { barbed: 1320 },
  wastePercent: 5,
  energizerRule: { basis: 'fence-mile', joulesPerMile: 1 },
  groundRodRule: { rodFtPerJoule: 3, rodLengthFt: 8, minimumRods: 3 },
}

export const withRuns = (runs: FenceRun[]): FenceTakeOffInput => ({ ...rules, runs })

const electric: FenceRun = {
  name: 'exclusion',
  role: 'exclusion',
  path: {
    points: [
      at(-10, 30),
      at(-105, 30),
      at(-180, -45),
      at(-180, -195),
      at(-105, -270),
      at(105, -270),
      at(180, -195),
      at(180, -45),
      at(105, 30),
      at(10, 30),
    ],
  },
  fence: 'electric',
  energized: true,
  inWater: false,
  wires: 3,
  hotWires: 2,
  postSpacingFt: 25,
  gates: [{ widthFt: 14 }],
  wireKind: 'high-tensile',
}

const lane = (name: string, eastFt: number): FenceRun => ({
  ...electric,
  name,
  role: 'lane',
  path: { points: [at(eastFt, 30), at(eastFt, -7.35)] },
  gates: [],
})

/** A pond of 64,800 ft² with its exclusion fence, lane and closing panel; site and figures are invented. */
export const pondJob: FenceTakeOffInput = {
  ...rules,
  runs: [
    electric,
    lane('lane west', -10),
    lane('lane east', 10),
    {
      ...electric,
      name: 'closing panel',
      role: 'closing',
      path: { points: [at(-10, -7.35), at(-10, -54.35), at(10, -54.35), at(10, -7.35)] },
      fence: 'barbed',
      energized: false,
      inWater: true,
      hotWires: 0,
      postSpacingFt: 10,
      gates: [],
      wireKind: 'barbless',
    },
  ],
  rollLengthFt: { 'high-tensile': 4000, barbless: 1320 },
  waterOutline: [
    at(-90, 0),
    at(90, 0),
    at(150, -60),
    at(150, -180),
    at(90, -240),
    at(-90, -240),
    at(-150, -180),
    at(-150, -60),
  ],
  laneAreaFt2: 600,
}
