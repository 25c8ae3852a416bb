import type { FieldErrors, FieldValues } from 'react-hook-form'

export interface FlatError {
  name: string
  message: string
}

const isBranch = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null

/** Every error of a form in reading order, by form path. */
export function flatErrors(errors: FieldErrors<FieldValues>, prefix = ''): FlatError[] {
  return Object.entries(errors).flatMap(([key, value]): FlatError[] => {
    if (!isBranch(value) || key === 'ref') return []
    const name = prefix === '' ? key : `${prefix}.${key}`
    if (typeof value.message === 'string')
      return [{ name: name.replace(/\.root$/, ''), message: value.message }]
    return flatErrors(value as FieldErrors<FieldValues>, name)
  })
}
