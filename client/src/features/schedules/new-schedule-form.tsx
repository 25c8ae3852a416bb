import { useEffect } from 'react'
import { useWatch } from 'react-hook-form'
import type { ScheduleView, scheduleInputSchema } from 'shared'
import type { z } from 'zod'
import { useMakeSchedule } from '../../api/schedules'
import { LeaveGuard } from '../../components/feedback/leave-guard'
import { FieldGrid } from '../../components/fields/field-grid'
import { Form } from '../../components/fields/form'
import { NumberField } from '../../components/fields/number-field'
import { SelectField } from '../../components/fields/select-field'
import { SubmitButton } from '../../components/fields/submit-button'
import { TextField } from '../../components/fields/text-field'
import { useFilledForm } from '../../components/fields/use-filled-form'
import { Section } from '../../components/layout/section'
import { LinesEditor } from './lines-editor'
import { PracticesField } from './practices-field'
import { hasTerm, scheduleFormSchema } from './schedule-form-schema'
import { kindWords } from './schedule-words'
import { TermFields } from './term-fields'

/** The year is not guessed: it stands empty until it is typed. */
const blank = {
  key: '',
  name: '',
  kind: 'unit-rate',
  effectiveFrom: '',
  effectiveTo: '',
  lines: [],
} as unknown as z.input<typeof scheduleInputSchema>

const kindChoices = Object.entries(kindWords).map(([value, label]) => ({ value, label }))

interface NewScheduleFormProps {
  onMade: (schedule: ScheduleView) => void
}

/** A schedule is made as a draft; its lines are typed or read from a CSV file, and mapped on its own page. */
export function NewScheduleForm({ onMade }: NewScheduleFormProps) {
  const make = useMakeSchedule()
  const { form } = useFilledForm(scheduleFormSchema, blank)
  const kind = useWatch({ control: form.control, name: 'kind' }) ?? blank.kind
  const hasTyped = Object.keys(form.formState.touchedFields).length > 0
  // Only once the form knows that it is saved: it asks before it is left otherwise.
  useEffect(() => {
    if (make.data) onMade(make.data)
  }, [make.data, onMade])
  return (
    <Form
      form={form}
      problem={make.error}
      label="New schedule"
      onSubmit={(values) => make.mutateAsync(values)}
    >
      <LeaveGuard hasUnsaved={hasTyped && !make.isSuccess} />
      <Section title="The fund">
        <FieldGrid>
          <TextField name="name" label="Name of the fund" />
          <TextField
            name="key"
            label="Short name"
            hint="Small letters, digits and hyphens; the same every year, such as county-water-fund"
          />
          <NumberField name="fiscalYear" label="Fiscal year" hint="Such as 2026" />
          <TextField name="effectiveFrom" label="First day" type="date" />
          <TextField name="effectiveTo" label="Last day" type="date" />
          <SelectField name="kind" label="It pays" choices={kindChoices} />
          <TermFields kind={kind} />
          <PracticesField />
        </FieldGrid>
      </Section>
      {hasTerm(kind, 'lines') && <LinesEditor />}
      <div style={{ marginTop: 24 }}>
        <SubmitButton words="Make the draft" busyWords="Making…" />
      </div>
    </Form>
  )
}
