import { zodResolver } from '@hookform/resolvers/zod'
import { useForm, type DefaultValues, type FieldValues } from 'react-hook-form'
import type { z } from 'zod'
import { plainSentence } from './plain-issues'

const MESSAGE_DELAY_MS = 250

/** A form that is right when the schema says so: not before the first visit of a field, then at every change. */
export function useSchemaForm<In extends FieldValues, Out>(
  schema: z.ZodType<Out, In>,
  defaultValues: DefaultValues<In>,
) {
  return useForm<In, unknown, Out>({
    resolver: zodResolver(schema, { error: plainSentence }),
    defaultValues,
    mode: 'onTouched',
    // A message that appears as a field is left would move a button away from under the press that left it.
    delayError: MESSAGE_DELAY_MS,
    shouldUnregister: false,
    shouldFocusError: false,
  })
}
