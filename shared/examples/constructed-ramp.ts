/** One invented ramp whose figures were worked out apart from the program, by hand and by fine numeric integration. */
export const groundLine = (
  [
    [0, 103.2],
    [20, 102.6],
    [35, 102.1],
    [42, 101.7],
    [46, 101.2],
    [49, 99.6],
    [60, 98.3],
    [72, 97],
    [85, 95.8],
    [100, 94.6],
    [115, 93.7],
    [130, 93.2],
  ] as const
).map(([stationFt, elevationFt]) => ({ stationFt, elevationFt }))

export const profileInput = {
  groundLine,
  fullPoolElevationFt: 100,
  lowWaterElevationFt: 96,
  topAboveFullPoolFt: 1.5,
  toeBelowFullPoolFt: 3,
  drinkingDepthAtLowWaterFt: 1.5,
  gradeRunPerRise: 8,
  waterSurfaceTodayFt: 98.6,
}

export const earthworkInput = {
  widthFt: 18,
  edgeAllowanceFt: 0,
  edgeRunPerRise: 1.5,
  rockThicknessIn: 12,
  cutSideRunPerRise: 3,
  fillSideRunPerRise: 3,
  waterSurfaceTodayFt: 98.6,
  stationIntervalFt: 10,
  swellPercent: 25,
  shrinkPercent: 10,
}
