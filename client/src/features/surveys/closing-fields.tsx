import Typography from '@mui/material/Typography'
import { FieldGrid } from '../../components/fields/field-grid'
import { NumberField } from '../../components/fields/number-field'
import { Section } from '../../components/layout/section'

/** The bench mark that the last foresight closes on, and how far off it may be. The largest allowance counts. */
export function ClosingFields() {
  return (
    <Section title="Closing bench mark">
      <Typography sx={{ color: 'text.secondary', mt: 2 }}>
        Left empty when the line does not close. The last row is then checked by the sums alone.
      </Typography>
      <FieldGrid column={200}>
        <NumberField name="closing.knownElevationFt" label="Known elevation" unit="ft" isOptional />
        <NumberField
          name="closing.lengthFt"
          label="Length of the line"
          hint="There and back"
          unit="ft"
          isOptional
        />
        <NumberField
          name="closing.lengthMiles"
          label="Length in miles"
          hint="In place of feet"
          unit="miles"
          isOptional
        />
        <NumberField
          name="closing.coefficientFt"
          label="Allowed for one mile"
          hint="Grows with the root of the length"
          unit="ft"
          isOptional
        />
        <NumberField
          name="closing.perSetupFt"
          label="Allowed for one setup"
          hint="Grows with the root of their number"
          unit="ft"
          isOptional
        />
        <NumberField
          name="closing.minimumFt"
          label="Allowed at least"
          hint="For very short lines"
          unit="ft"
          isOptional
        />
      </FieldGrid>
    </Section>
  )
}
