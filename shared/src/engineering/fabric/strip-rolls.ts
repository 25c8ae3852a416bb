export interface FabricRoll {
  widthFt: number
  lengthFt: number
}

export interface StripRolls {
  rolls: number
  piecesPerStrip: number
  /** End laps inside one strip, ft; 0 while a strip comes off one roll. */
  endLapFt: number
}

interface StripRollsInput {
  strips: number
  stripLengthFt: number
  /** Lap of two pieces end to end. */
  lapFt: number
  roll: FabricRoll
}

const WHOLE = 1e-9

/** Rolls for a number of equal strips: whole strips per roll; pieced only when a strip is longer than a roll. */
export function stripRolls({ strips, stripLengthFt, lapFt, roll }: StripRollsInput): StripRolls {
  const stripsPerRoll = Math.floor(roll.lengthFt / stripLengthFt + WHOLE)
  if (stripsPerRoll >= 1) {
    return { rolls: Math.ceil(strips / stripsPerRoll - WHOLE), piecesPerStrip: 1, endLapFt: 0 }
  }
  const pieces = Math.ceil((stripLengthFt - lapFt) / (roll.lengthFt - lapFt) - WHOLE)
  const lastPieceFt = stripLengthFt + (pieces - 1) * lapFt - (pieces - 1) * roll.lengthFt
  const lastPiecesPerRoll = Math.floor(roll.lengthFt / lastPieceFt + WHOLE)
  return {
    rolls: strips * (pieces - 1) + Math.ceil(strips / lastPiecesPerRoll - WHOLE),
    piecesPerStrip: pieces,
    endLapFt: (pieces - 1) * lapFt,
  }
}
