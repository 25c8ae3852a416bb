/** Turn from one heading to the next, degrees, 0 (straight on) to 180 (back). */
export function deflectionDeg(fromRad: number, toRad: number): number {
  const turn = Math.abs(toRad - fromRad) % (2 * Math.PI)
  return (Math.min(turn, 2 * Math.PI - turn) * 180) / Math.PI
}
