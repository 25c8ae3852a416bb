import Typography from '@mui/material/Typography'
import { useQuery } from '@tanstack/react-query'
import { useWatch } from 'react-hook-form'
import { quantityCatalogue, unitText, type QuantityKey, type ScheduleLine } from 'shared'
import { scheduleQuery, schedulesQuery } from '../../api/schedules'
import { FieldGrid } from '../../components/fields/field-grid'
import { RecordNumber } from './record-number'

interface ContractedFieldsProps {
  name: string
}

const isKnown = (key: string): key is QuantityKey => key in quantityCatalogue

const mappedKeys = (lines: readonly ScheduleLine[]): QuantityKey[] => [
  ...new Set(
    lines.flatMap(({ quantityKey }) => (quantityKey !== null && isKnown(quantityKey) ? [quantityKey] : [])),
  ),
]

/** What a contract with the fund holds of each quantity. Only a fund that pays by the unit has such lines. */
export function ContractedFields({ name }: ContractedFieldsProps) {
  const scheduleKey: unknown = useWatch({ name: name.replace(/contracted$/, 'scheduleKey') })
  const schedules = useQuery(schedulesQuery)
  const chosen = schedules.data?.find(({ key, status }) => key === scheduleKey && status === 'in-force')
  const isByUnit = chosen?.kind === 'unit-rate'
  const schedule = useQuery({ ...scheduleQuery(chosen?.id ?? ''), enabled: isByUnit })
  if (!isByUnit || schedule.data === undefined) return null
  return (
    <>
      <Typography variant="body2" sx={{ color: 'text.secondary' }}>
        Quantities under contract. Left empty: as much as the design needs.
      </Typography>
      <FieldGrid column={184}>
        {mappedKeys(schedule.data.lines).map((key) => (
          <RecordNumber
            key={key}
            name={name}
            entry={key}
            label={quantityCatalogue[key].description}
            unit={unitText(quantityCatalogue[key].unit)}
            isOptional
          />
        ))}
      </FieldGrid>
    </>
  )
}
