import Box from '@mui/material/Box'
import Button from '@mui/material/Button'
import { useWatch } from 'react-hook-form'
import type { ScheduleInput } from 'shared'
import { FieldGrid } from '../../components/fields/field-grid'
import { RateField } from '../../components/fields/rate-field'
import { TextField } from '../../components/fields/text-field'
import { perUnit } from '../../components/layout/per-unit'

interface LineRowProps {
  index: number
  isOpen: boolean
  onOpen: () => void
  onClose: () => void
  onRemove: () => void
}

export function LineRow({ index, isOpen, onOpen, onClose, onRemove }: LineRowProps) {
  const line = useWatch<ScheduleInput, `lines.${number}`>({ name: `lines.${index}` })
  const name = line?.code || `line ${index + 1}`
  if (line === undefined) return null
  return (
    <Box component="li" sx={{ borderBottom: 1, borderColor: 'divider', py: 2 }}>
      {isOpen ? (
        <LineFields index={index} />
      ) : (
        <Box component="span" className="figure">
          <strong>{name}</strong>: {line.title}, practice {line.practice}, ${line.baseRate}
          {line.higherRate && `, at the higher rate $${line.higherRate}`} {perUnit(line.unit ?? '')}
        </Box>
      )}{' '}
      <Button variant="text" onClick={isOpen ? onClose : onOpen}>
        {isOpen ? 'Close' : 'Change'} {name}
      </Button>{' '}
      <Button variant="text" onClick={onRemove}>
        Take {name} out
      </Button>
    </Box>
  )
}

function LineFields({ index }: { index: number }) {
  const at = `lines.${index}`
  return (
    <FieldGrid column={160}>
      <TextField name={`${at}.code`} label="Code" />
      <TextField name={`${at}.practice`} label="Practice" hint="Three digits" inputMode="numeric" />
      <TextField name={`${at}.title`} label="Line" />
      <TextField name={`${at}.unit`} label="Unit" hint="Such as ton, ft, each" />
      <RateField name={`${at}.baseRate`} label="Rate" unit="$ a unit" />
      <RateField name={`${at}.higherRate`} label="Higher rate" unit="$ a unit" isOptional />
    </FieldGrid>
  )
}
