import { useController } from 'react-hook-form'
import { fieldId } from './field-id'
import { useFieldLabel } from './form-labels'

/** One field of the form around it: its value, its error in words and the id of its control. */
export function useField(name: string, label: string) {
  const { field, fieldState } = useController({ name })
  useFieldLabel(name, label)
  return { id: fieldId(name), field, error: fieldState.error?.message }
}
