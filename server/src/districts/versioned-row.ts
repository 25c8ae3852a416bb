import { formatCivilDate, Problem, type VersionedStatus } from 'shared'

/** A list or set that is a draft until it is put in force, and retired by the next. */
export interface VersionedRow {
  districtId: string
  id: string
  /** Of rows with a key one of each key is in force; of rows without, one of the district. */
  key?: string
  name: string
  status: VersionedStatus
  version: number
  effectiveFrom: string
  effectiveTo?: string
  inForceAt: Date | null
  retiredAt: Date | null
}

const inUse: Readonly<Record<Exclude<VersionedStatus, 'draft'>, string>> = {
  'in-force': 'is in force',
  retired: 'was in force and is retired',
}

/** @throws Problem already-in-use: what a design may have been worked out with stays as it was. */
export function requireDraft({ name, status }: Pick<VersionedRow, 'name' | 'status'>, noun: string): void {
  if (status === 'draft') return
  const detail = `${name} ${inUse[status]}, so it can no longer be changed. Make a new ${noun} and put that in force.`
  throw new Problem('already-in-use', { detail })
}

/**
 * Whatever is in force is taken for every design from this moment on, so it must be made for this day.
 *
 * @throws Problem invalid-fields with the date that stands against it.
 */
export function requireEffective(
  { name, effectiveFrom, effectiveTo }: Pick<VersionedRow, 'name' | 'effectiveFrom' | 'effectiveTo'>,
  onDate: string,
  noun: string,
): void {
  if (effectiveFrom > onDate) {
    refuse(
      '/effectiveFrom',
      `${name} takes effect on ${formatCivilDate(effectiveFrom)}. Put it in force on that day or later.`,
    )
  }
  if (effectiveTo !== undefined && effectiveTo < onDate) {
    refuse(
      '/effectiveTo',
      `${name} ended on ${formatCivilDate(effectiveTo)}. Make a new ${noun} for the time since.`,
    )
  }
}

function refuse(pointer: string, message: string): never {
  throw new Problem('invalid-fields', { detail: message, fields: [{ pointer, message }] })
}
