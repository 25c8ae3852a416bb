import { EngineeringInputError } from '../engineering-input-error.js'
import { requireNumber } from '../require-number.js'
import {
  bermVelocityTable,
  sodVelocityTable,
  type BermCover,
  type BermSoil,
  type SodCover,
  type SodSoil,
} from './permissible-velocity-tables.js'

export interface BermVelocityInput {
  table: 'berm'
  soil: BermSoil
  cover: BermCover
}

export interface SodVelocityInput {
  table: 'sod'
  soil: SodSoil
  cover: SodCover
  /** Grade of the channel, ft/ft, greater than 0 and at most 1. */
  channelGradeFtPerFt: number
}

export type PermissibleVelocityInput = BermVelocityInput | SodVelocityInput

export interface PermissibleVelocity {
  /** Greatest velocity, ft/s; absent when the table does not allow this cover on this grade. */
  limitFtPerS?: number
  source: string
}

/**
 * Greatest velocity a channel's soil and cover bear, from a published table.
 *
 * @returns the limit in ft/s with its source.
 * @throws EngineeringInputError naming soil, cover or channelGradeFtPerFt.
 * Source: Minnesota Stormwater Manual (table 'berm'); SCS-TP-61, March 1947, revised June 1954 (table 'sod').
 * @example permissibleVelocity({ table: 'berm', soil: 'sand-silt-loam', cover: 'good' }).limitFtPerS // 3
 */
export function permissibleVelocity(input: PermissibleVelocityInput): PermissibleVelocity {
  return input.table === 'berm' ? alongBerm(input) : onSod(input)
}

function alongBerm({ soil, cover }: BermVelocityInput): PermissibleVelocity {
  const byCover: Record<string, number> | undefined = bermVelocityTable.ftPerS[soil]
  if (!byCover) throw unknown('soil', Object.keys(bermVelocityTable.ftPerS))
  const limitFtPerS = byCover[cover]
  if (limitFtPerS === undefined) throw unknown('cover', Object.keys(byCover))
  return { limitFtPerS, source: bermVelocityTable.source }
}

function onSod(input: SodVelocityInput): PermissibleVelocity {
  const value = input.channelGradeFtPerFt
  const grade = requireNumber({ field: 'channelGradeFtPerFt', value, exclusiveMin: 0, max: 1 })
  const covers: Partial<typeof sodVelocityTable.covers> = sodVelocityTable.covers
  const rows = covers[input.cover]?.rows
  if (!rows) throw unknown('cover', Object.keys(covers))
  const slopePercent = grade * 100 - 1e-9
  const row = rows.find(
    ({ aboveSlopePercent, toSlopePercent }) =>
      slopePercent > aboveSlopePercent && slopePercent <= toSlopePercent,
  )
  if (!row) return { source: sodVelocityTable.source }
  const byStrength: Partial<Record<SodSoil, number>> = row.ftPerS
  const limitFtPerS = byStrength[input.soil]
  if (limitFtPerS === undefined) throw unknown('soil', Object.keys(row.ftPerS))
  return { limitFtPerS, source: sodVelocityTable.source }
}

const unknown = (field: string, known: string[]) =>
  new EngineeringInputError({ field, message: `${field} is not known; it must be ${known.join(', ')}.` })
