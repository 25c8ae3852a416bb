import type { ScheduleInput } from 'shared'
import { MoneyField } from '../../components/fields/money-field'
import { NumberField } from '../../components/fields/number-field'
import { SelectField } from '../../components/fields/select-field'
import { hasTerm } from './schedule-form-schema'
import { percentOfWords } from './schedule-words'

const percentOfChoices = Object.entries(percentOfWords).map(([value, label]) => ({ value, label }))

interface TermFieldsProps {
  kind: ScheduleInput['kind']
}

/** The terms that this kind of fund has. */
export function TermFields({ kind }: TermFieldsProps) {
  return (
    <>
      {hasTerm(kind, 'percent') && <NumberField name="percent" label="Percent it pays" unit="%" />}
      {hasTerm(kind, 'higherPercent') && (
        <NumberField name="higherPercent" label="Percent at the higher rate" unit="%" isOptional />
      )}
      {hasTerm(kind, 'percentOf') && (
        <SelectField name="percentOf" label="The percent is of" choices={percentOfChoices} />
      )}
      {hasTerm(kind, 'amount') && <MoneyField name="amount" label="Amount" />}
      <MoneyField name="cap" label="At most for one job" isOptional />
      <NumberField name="advancePercent" label="In advance, at most" unit="%" isOptional />
    </>
  )
}
