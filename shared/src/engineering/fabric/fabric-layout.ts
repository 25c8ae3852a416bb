import { type FabricRoll, stripRolls } from './strip-rolls.js'

export interface FabricJoint {
  /** Fabric laid before this joint, ft from the toe end (across) or from one side (along). */
  atFt: number
  lapFt: number
}

export interface FabricLayout {
  strips: number
  stripLengthFt: number
  grossAreaFt2: number
  lapAreaFt2: number
  trimAreaFt2: number
  joints: FabricJoint[]
  piecesPerStrip: number
  rolls: number
}

interface FabricLayoutInput {
  /** Distance to be covered by strips side by side. */
  coverFt: number
  stripLengthFt: number
  roll: FabricRoll
  lapAt: (coveredFt: number) => number
  endLapFt: number
}

/** Strips side by side until the distance is covered, each joint with its own lap. */
export function fabricLayout({
  coverFt,
  stripLengthFt,
  roll,
  lapAt,
  endLapFt,
}: FabricLayoutInput): FabricLayout {
  const joints: FabricJoint[] = []
  let coveredFt = roll.widthFt
  while (coveredFt < coverFt - 1e-9) {
    const lapFt = lapAt(coveredFt)
    joints.push({ atFt: coveredFt, lapFt })
    coveredFt += roll.widthFt - lapFt
  }
  const strips = joints.length + 1
  const pieced = stripRolls({ strips, stripLengthFt, lapFt: endLapFt, roll })
  const grossAreaFt2 = strips * roll.widthFt * (stripLengthFt + pieced.endLapFt)
  const sideLapFt = joints.reduce((sum, { lapFt }) => sum + lapFt, 0)
  const lapAreaFt2 = sideLapFt * stripLengthFt + strips * roll.widthFt * pieced.endLapFt
  return {
    strips,
    stripLengthFt,
    grossAreaFt2,
    lapAreaFt2,
    trimAreaFt2: Math.max(0, grossAreaFt2 - coverFt * stripLengthFt - lapAreaFt2),
    joints,
    piecesPerStrip: pieced.piecesPerStrip,
    rolls: pieced.rolls,
  }
}
