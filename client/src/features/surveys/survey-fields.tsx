import type { SurveyInput } from 'shared'
import { FieldGrid } from '../../components/fields/field-grid'
import { NumberField } from '../../components/fields/number-field'
import { SelectField } from '../../components/fields/select-field'
import { Section } from '../../components/layout/section'
import { ClosingFields } from './closing-fields'
import { GroundLineGrid } from './ground-line-grid'
import { LevelNotesGrid } from './level-notes-grid'
import type { SurveySoFar } from './reduce-so-far'

const kindChoices = [
  { value: 'level-notes', label: 'Level notes' },
  { value: 'ground-line', label: 'Ground line, measured another way' },
]

interface SurveyFieldsProps {
  kind: SurveyInput['kind']
  soFar: SurveySoFar
}

export function SurveyFields({ kind, soFar }: SurveyFieldsProps) {
  const isNotes = kind === 'level-notes'
  return (
    <>
      <FieldGrid>
        <SelectField name="kind" label="How the ground was measured" choices={kindChoices} />
        {isNotes && (
          <NumberField
            name="startElevationFt"
            label="Starting elevation"
            hint="Of the bench mark on the first row"
            unit="ft"
          />
        )}
        <NumberField
          name="waterSurfaceFt"
          label="Water surface"
          hint="On the day; needed for depths of water"
          unit="ft"
          isOptional
        />
      </FieldGrid>
      <Section title={isNotes ? 'Level notes' : 'Ground line as typed'}>
        {isNotes ? <LevelNotesGrid soFar={soFar} /> : <GroundLineGrid />}
      </Section>
      {isNotes && <ClosingFields />}
    </>
  )
}
