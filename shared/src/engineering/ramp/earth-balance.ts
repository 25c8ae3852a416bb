import type { EarthVolumes } from '../design/ramp-shapes.js'
import { requireNumber } from '../require-number.js'
import type { Stripping } from './stripping.js'
import { FT3_PER_YD3 } from '../unit-factors.js'

export interface BalanceSettings {
  swellPercent?: number
  shrinkPercent?: number
  /** Dry earth from beside the ramp, such as the approach pad, bank yd³. */
  otherDryCutYd3?: number
  /** Depth that wet spoil is spread to, in; without it no area is given. */
  spreadDepthIn?: number
}

export interface EarthBalance {
  swellPercent: number
  shrinkPercent: number
  dryCutBankYd3: number
  wetCutBankYd3: number
  /** Fill and edge backfill in place. */
  compactedNeededYd3: number
  bankNeededYd3: number
  borrowBankYd3: number
  dryCutLeftBankYd3: number
  /** Fill below today's water: it cannot be compacted and must be rock or clean coarse fill. Part of the fill. */
  coarseFillYd3: number
  spoilBankYd3: number
  spoilLooseYd3: number
  spoilSpreadAreaFt2?: number
}

interface BalanceInput extends BalanceSettings {
  volumes: EarthVolumes
  stripping: Stripping
}

/**
 * Where the earth goes: bank needed = (fill + edge backfill)/(1 − shrink), from dry cut first, the rest is borrow. Wet
 * cut is spoil and never fill: loose = bank · (1 + swell).
 */
export function earthBalance(input: BalanceInput): EarthBalance {
  const { volumes, stripping } = input
  const setting = (field: keyof BalanceSettings, exclusiveMax?: number) =>
    requireNumber({ field, value: input[field] ?? 0, min: 0, exclusiveMax })
  const swellPercent = setting('swellPercent')
  const shrinkPercent = setting('shrinkPercent', 100)
  const dryCutBankYd3 = Math.max(0, volumes.dryCutYd3 - stripping.fromCutYd3) + setting('otherDryCutYd3')
  const compactedNeededYd3 = volumes.fillYd3 + volumes.edgeBackfillYd3 + stripping.underFillYd3
  const bankNeededYd3 = compactedNeededYd3 / (1 - shrinkPercent / 100)
  const spoilLooseYd3 = volumes.wetCutYd3 * (1 + swellPercent / 100)
  const spreadIn = input.spreadDepthIn
  const spread =
    spreadIn === undefined
      ? {}
      : {
          spoilSpreadAreaFt2: spreadArea(
            spoilLooseYd3,
            requireNumber({ field: 'spreadDepthIn', value: spreadIn, exclusiveMin: 0 }),
          ),
        }
  return {
    swellPercent,
    shrinkPercent,
    dryCutBankYd3,
    wetCutBankYd3: volumes.wetCutYd3,
    compactedNeededYd3,
    bankNeededYd3,
    borrowBankYd3: Math.max(0, bankNeededYd3 - dryCutBankYd3),
    dryCutLeftBankYd3: Math.max(0, dryCutBankYd3 - bankNeededYd3),
    coarseFillYd3: volumes.wetFillYd3,
    spoilBankYd3: volumes.wetCutYd3,
    spoilLooseYd3,
    ...spread,
  }
}

function spreadArea(looseYd3: number, depthIn: number): number {
  return (looseYd3 * FT3_PER_YD3) / (depthIn / 12)
}
