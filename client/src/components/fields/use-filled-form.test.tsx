import { render, screen } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { useWatch } from 'react-hook-form'
import { describe, expect, it, vi } from 'vitest'
import { z } from 'zod'
import { Form } from './form'
import { NumberField } from './number-field'
import { readSchema } from './read-schema'
import { SelectField } from './select-field'
import { useFilledForm } from './use-filled-form'
import { withoutEmpty } from './without-empty'

interface Typed {
  lengthFt?: unknown
  kind?: unknown
}
const schema = z.strictObject({ lengthFt: z.number().optional(), kind: z.enum(['a', 'b']).optional() })
const typedSchema = readSchema<Typed, z.infer<typeof schema>>(schema, withoutEmpty)
const choices = [
  { value: 'a', label: 'A' },
  { value: 'b', label: 'B' },
]

function Example({ onSubmit }: { onSubmit: (values: unknown) => void }) {
  const { form } = useFilledForm(typedSchema, { lengthFt: 5, kind: 'a' })
  const typed = useWatch({ control: form.control })
  return (
    <Form form={form} onSubmit={onSubmit}>
      {typed.lengthFt !== undefined && (
        <>
          <NumberField name="lengthFt" label="Length" isOptional />
          <SelectField name="kind" label="Kind" choices={choices} emptyLabel="none" isOptional />
        </>
      )}
      <button type="submit">Save</button>
    </Form>
  )
}

describe('useFilledForm', () => {
  it('shows what it was filled with', () => {
    render(<Example onSubmit={vi.fn()} />)
    expect(screen.getByLabelText(/^Length/)).toHaveValue('5')
    expect(screen.getByLabelText(/^Kind/)).toHaveValue('a')
  })

  it('lets a field be emptied, and sends it no more', async () => {
    const onSubmit = vi.fn()
    const user = userEvent.setup()
    render(<Example onSubmit={onSubmit} />)
    await user.clear(screen.getByLabelText(/^Length/))
    await user.selectOptions(screen.getByLabelText(/^Kind/), 'none')
    expect(screen.getByLabelText(/^Length/)).toHaveValue('')
    expect(screen.getByLabelText(/^Kind/)).toHaveValue('')
    await user.click(screen.getByText('Save'))
    expect(onSubmit).toHaveBeenCalledWith({})
  })
})
