import { useEffect, useMemo } from 'react'
import { quantityKeys, type CostListInput, type CostListView } from 'shared'
import { useMakeCostList } from '../../api/districts'
import { LeaveGuard } from '../../components/feedback/leave-guard'
import { FieldGrid } from '../../components/fields/field-grid'
import { Form } from '../../components/fields/form'
import { SubmitButton } from '../../components/fields/submit-button'
import { TextField } from '../../components/fields/text-field'
import { useFilledForm } from '../../components/fields/use-filled-form'
import { RuledTable, type Column } from '../../components/layout/ruled-table'
import { Section } from '../../components/layout/section'
import { costFormSchema, rowsFrom } from './cost-form-schema'
import { movedProblem } from './moved-problem'
import { PriceRow } from './price-row'

const columns: readonly Column[] = [
  { key: 'quantity', title: 'Quantity' },
  { key: 'low', title: 'Low' },
  { key: 'typical', title: 'Typical' },
  { key: 'high', title: 'High' },
]

interface NewCostListFormProps {
  /** Its prices stand in the boxes to begin with. */
  inForce: CostListView | undefined
  onMade: () => void
}

export function NewCostListForm({ inForce, onMade }: NewCostListFormProps) {
  const make = useMakeCostList()
  const { form } = useFilledForm(costFormSchema, {
    name: '',
    effectiveFrom: '',
    source: inForce?.source ?? '',
    lines: rowsFrom(inForce),
  })
  const { touchedFields } = form.formState
  const hasTyped = Object.keys(touchedFields).length > 0
  const problem = useMovedProblem(make.error, make.variables)
  // Only once the form knows that it is saved: it asks before it is left otherwise.
  useEffect(() => {
    if (make.isSuccess) onMade()
  }, [make.isSuccess, onMade])
  return (
    <Form
      form={form}
      problem={problem}
      label="New list of unit costs"
      onSubmit={(values) => make.mutateAsync(values)}
    >
      <LeaveGuard hasUnsaved={hasTyped && !make.isSuccess} />
      <FieldGrid>
        <TextField name="name" label="Name of the list" hint="Such as Unit costs 2026" />
        <TextField name="effectiveFrom" label="Good from" type="date" />
        <TextField name="source" label="Where the prices come from" hint="Such as bids of the last year" />
      </FieldGrid>
      <Section
        title="Unit costs"
        aside="Low, typical and high go upward. A row left empty is not in the list."
      >
        <RuledTable caption="Unit costs of every quantity" columns={columns} minWidth={720}>
          {quantityKeys.map((key, index) => (
            <PriceRow key={key} quantity={key} index={index} />
          ))}
        </RuledTable>
      </Section>
      <div style={{ marginTop: 24 }}>
        <SubmitButton words="Make the draft" busyWords="Making…" />
      </div>
    </Form>
  )
}

const useMovedProblem = (error: Error | null, sent: CostListInput | undefined) =>
  useMemo(() => movedProblem(error, sent?.lines ?? []), [error, sent])
