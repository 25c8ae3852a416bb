import { useController } from 'react-hook-form'
import { fieldId } from './field-id'
import { useFieldLabel } from './form-labels'

/** One field of the form around it: its value, its error in words and the id of its control. */
export function useField(name: string, label: string) {
  const { field, fieldState, formState } = useController({ name })
  useFieldLabel(name, label)
  // The library judges a new row as it is added; its boxes keep quiet until they were visited or a save failed.
  const hasFailed = formState.isSubmitted && !formState.isSubmitSuccessful
  const isHeard = fieldState.isTouched || hasFailed || fieldState.error?.type === 'server'
  return { id: fieldId(name), field, error: isHeard ? fieldState.error?.message : undefined }
}
