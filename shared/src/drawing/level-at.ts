interface LevelPoint {
  stationFt: number
  elevationFt: number
}

/** Elevation of a line at a station; outside its reach the nearest end holds, which only drawings may assume. */
export function levelAt(line: readonly LevelPoint[], stationFt: number): number {
  const first = line[0]
  const last = line.at(-1)
  if (!first || !last) return 0
  if (stationFt <= first.stationFt) return first.elevationFt
  if (stationFt >= last.stationFt) return last.elevationFt
  const index = line.findIndex((point) => point.stationFt >= stationFt)
  const after = line[index] ?? last
  const before = line[index - 1] ?? first
  const span = after.stationFt - before.stationFt
  if (span === 0) return after.elevationFt
  const share = (stationFt - before.stationFt) / span
  return before.elevationFt + share * (after.elevationFt - before.elevationFt)
}
