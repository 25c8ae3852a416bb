import Box from '@mui/material/Box'
import Button from '@mui/material/Button'
import { useState } from 'react'
import { useFieldArray, useFormContext } from 'react-hook-form'
import type { ScheduleInput, ScheduleLine } from 'shared'
import { Section } from '../../components/layout/section'
import { CsvReader } from './csv-reader'
import { LineRow } from './line-row'

const newLine = {
  code: '',
  practice: '',
  title: '',
  unit: '',
  baseRate: '',
  quantityKey: null,
} satisfies ScheduleLine

/** Lines typed one by one or read from a file; each stands as a sentence until somebody opens it. */
export function LinesEditor() {
  const { formState } = useFormContext<ScheduleInput>()
  const { fields, append, replace, remove } = useFieldArray<ScheduleInput, 'lines'>({ name: 'lines' })
  const [openId, setOpenId] = useState<string | null>(null)
  const [hasAdded, setHasAdded] = useState(false)
  const lastId = fields.at(-1)?.id
  const { lines: errors } = formState.errors
  const isOpen = (id: string, index: number) =>
    id === openId || (hasAdded && openId === null && id === lastId) || errors?.[index] !== undefined
  const open = (id: string | null) => {
    setOpenId(id)
    setHasAdded(false)
  }
  return (
    <Section title="Lines" aside={fields.length === 1 ? '1 line' : `${fields.length} lines`}>
      <CsvReader
        onRead={(lines) => {
          open(null)
          replace(lines)
        }}
      />
      <Box component="ol" sx={{ listStyle: 'none', m: 0, p: 0 }}>
        {fields.map((field, index) => (
          <LineRow
            key={field.id}
            index={index}
            isOpen={isOpen(field.id, index)}
            onOpen={() => open(field.id)}
            onClose={() => open(null)}
            onRemove={() => remove(index)}
          />
        ))}
      </Box>
      <Button
        sx={{ mt: 3 }}
        onClick={() => {
          append(newLine)
          setOpenId(null)
          setHasAdded(true)
        }}
      >
        Add a line
      </Button>
    </Section>
  )
}
