import { render, screen } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { describe, expect, it } from 'vitest'
import { z } from 'zod'
import { Form } from './form'
import { SubmitButton } from './submit-button'
import { TextField } from './text-field'
import { useFilledForm } from './use-filled-form'

const schema = z.object({
  place: z.string().min(1, 'Name the place'),
  water: z.string().min(1, 'Name the water'),
})

function PlaceForm() {
  const { form } = useFilledForm(schema, { place: 'North bank', water: '' })
  return (
    <Form form={form} onSubmit={() => undefined} label="Where it is">
      <TextField name="place" label="Place" />
      <TextField name="water" label="Water" />
      <SubmitButton words="Save" busyWords="Saving…" />
    </Form>
  )
}

const save = () => userEvent.click(screen.getByRole('button', { name: 'Save' }))

describe('a form', () => {
  it('lists what stopped a save, and nothing that is typed after one that went well', async () => {
    render(<PlaceForm />)
    expect(await screen.findByDisplayValue('North bank')).toBeInTheDocument()
    await save()
    expect(await screen.findAllByText(/Name the water/)).not.toHaveLength(0)
    await userEvent.type(screen.getByLabelText('Water'), 'Long pond')
    await save()
    expect(screen.queryByText(/Name the water/)).not.toBeInTheDocument()
    await userEvent.clear(screen.getByLabelText('Place'))
    await userEvent.tab()
    expect(screen.queryByRole('alert')).not.toBeInTheDocument()
  }, 30_000)
})
