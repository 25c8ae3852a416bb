import type { Choice } from '../../components/fields/select-field'
import type { FieldSpec } from './part-spec'

type More = Pick<FieldSpec, 'hint' | 'isOptional'>

const field = (
  control: FieldSpec['control'],
  name: string,
  label: string,
  more: Partial<FieldSpec> = {},
): FieldSpec => ({ kind: 'field', control, name, label, ...more })

export const number = (name: string, label: string, unit?: string, more: More = {}): FieldSpec =>
  field('number', name, label, { unit, ...more })

export const station = (name: string, label: string, more: More = {}): FieldSpec =>
  field('station', name, label, more)

export const text = (name: string, label: string, more: More = {}): FieldSpec =>
  field('text', name, label, more)

export const select = (name: string, label: string, choices: readonly Choice[], more: More = {}): FieldSpec =>
  field('select', name, label, { choices, ...more })

export const check = (name: string, label: string, more: More = {}): FieldSpec =>
  field('check', name, label, more)

export const money = (name: string, label: string, more: More = {}): FieldSpec =>
  field('money', name, label, more)
