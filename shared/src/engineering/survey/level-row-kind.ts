import { EngineeringInputError } from '../engineering-input-error.js'
import { requireNumber } from '../require-number.js'
import type { LevelRow } from './reduce-level-notes.js'

export type LevelRowKind = 'start' | 'intermediate' | 'turning-point' | 'foresight' | 'sounding'

const KIND_OF_SIGHTS: Readonly<Record<string, LevelRowKind>> = {
  B: 'start',
  I: 'intermediate',
  BF: 'turning-point',
  F: 'foresight',
  D: 'sounding',
}

const SIGHTS = [
  { letter: 'B', key: 'backsightFt' },
  { letter: 'I', key: 'intermediateFt' },
  { letter: 'F', key: 'foresightFt' },
  { letter: 'D', key: 'waterDepthFt' },
] as const

/**
 * What a row of the field book does. Rows are refused by their number as a person counts them (from 1).
 * Rod readings may be negative: a rod held upside down under a beam or branch.
 */
export function levelRowKind({ row, index }: { row: LevelRow; index: number }): LevelRowKind {
  const present = SIGHTS.filter(({ key }) => row[key] !== undefined)
  for (const { key } of present) {
    const min = key === 'waterDepthFt' ? 0 : undefined
    requireNumber({ field: `rows[${index}].${key}`, value: row[key], min })
  }
  const letters = present.map(({ letter }) => letter).join('')
  const kind = KIND_OF_SIGHTS[letters]
  if (kind === undefined) return refuse(index, sightsSentence(letters))
  if (index === 0 && kind !== 'start')
    return refuse(index, 'the first row must have a backsight and nothing else')
  if (index > 0 && kind === 'start') {
    return refuse(index, 'a backsight without a foresight; a turning point needs both on one row')
  }
  return kind
}

function sightsSentence(letters: string): string {
  if (letters === '') return 'no backsight, intermediate sight, foresight or water depth'
  if (letters.includes('D')) return 'a water depth and a rod reading; it must have one of them'
  return 'an intermediate sight together with another sight; a turning point has a backsight and a foresight'
}

function refuse(index: number, sentence: string): never {
  throw new EngineeringInputError({ field: `rows[${index}]`, message: `Row ${index + 1}: ${sentence}.` })
}
