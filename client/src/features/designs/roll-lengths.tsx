import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import { useWatch } from 'react-hook-form'
import { FieldGrid } from '../../components/fields/field-grid'
import { wireKindsOf } from './plan-draft'
import { RecordNumber } from './record-number'

interface RollLengthsProps {
  name: string
}

/** How long a roll is, for each kind of wire that the runs name. */
export function RollLengths({ name }: RollLengthsProps) {
  const kinds = wireKindsOf(useWatch({ name: name.slice(0, name.lastIndexOf('.')) }))
  return (
    <Box component="section" aria-label="Length of a roll" sx={{ mt: 5 }}>
      <Typography variant="h3" sx={{ borderBottom: 1, borderColor: 'divider', pb: 1 }}>
        Length of a roll
      </Typography>
      {kinds.length === 0 && (
        <Typography variant="body2" sx={{ color: 'text.secondary', mt: 2 }}>
          Name the kind of wire of each run first.
        </Typography>
      )}
      <FieldGrid column={184}>
        {kinds.map((kind) => (
          <RecordNumber key={kind} name={name} entry={kind} label={kind} unit="ft" />
        ))}
      </FieldGrid>
    </Box>
  )
}
