import type { ComponentType } from 'react'
import { CheckField } from '../../components/fields/check-field'
import { MoneyField } from '../../components/fields/money-field'
import { NumberField } from '../../components/fields/number-field'
import { SelectField } from '../../components/fields/select-field'
import { StationField } from '../../components/fields/station-field'
import { TextField } from '../../components/fields/text-field'
import type { FieldControl, FieldSpec } from './part-spec'

interface SpecFieldProps {
  name: string
  spec: FieldSpec
}

type ControlProps = Pick<FieldSpec, 'label' | 'hint' | 'unit' | 'isOptional'> & {
  name: string
  choices: NonNullable<FieldSpec['choices']>
  emptyLabel?: string
}

const controls: Record<FieldControl, ComponentType<ControlProps>> = {
  number: NumberField,
  station: StationField,
  text: TextField,
  select: SelectField,
  check: CheckField,
  money: MoneyField,
}

/** One field of the catalogue, drawn by the control it asks for. */
export function SpecField({ name, spec }: SpecFieldProps) {
  const { control, label, hint, unit, isOptional, choices = [] } = spec
  const Control = controls[control]
  return (
    <Control
      name={name}
      label={label}
      hint={hint}
      unit={unit}
      isOptional={isOptional}
      choices={choices}
      emptyLabel={isOptional ? 'none' : undefined}
    />
  )
}
