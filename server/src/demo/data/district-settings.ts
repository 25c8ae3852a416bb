import type { SettingValue } from 'shared'

const source = 'decided by the district board, invented for this example'

const decidedOn = (sourceDate: string, values: Record<string, number>): SettingValue[] =>
  Object.entries(values).map(([key, value]) => ({ key, value, source, sourceDate }))

const common = {
  toePitMaxFt: 0.5,
  toeHangMaxFt: 0.5,
  depthAtClosingPanelMaxFt: 6,
  bermPastRampMinFt: 10,
  bermOutletToRampMinFt: 40,
  topAboveFloodPoolMinFt: 0.25,
  approachGradeMinRunPerRise: 6,
}

export const sableBasinSettings = decidedOn('2026-02-10', {
  swellPercent: 25,
  shrinkPercent: 10,
  bermFreeboardFt: 0.3,
  bermSettlementPercent: 10,
  approachGradeRunPerRise: 10,
  spoilSpreadDepthIn: 6,
  topAboveFullPoolMinFt: 1,
  rockThicknessCautionIn: 12,
  gateWidthMinFt: 12,
  ...common,
})

export const corrowForkSettings = decidedOn('2026-01-20', {
  swellPercent: 30,
  shrinkPercent: 12,
  bermFreeboardFt: 0.4,
  bermSettlementPercent: 12,
  approachGradeRunPerRise: 12,
  spoilSpreadDepthIn: 8,
  topAboveFullPoolMinFt: 1.5,
  rockThicknessCautionIn: 10,
  gateWidthMinFt: 14,
  ...common,
})
