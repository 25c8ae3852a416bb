import { zodResolver } from '@hookform/resolvers/zod'
import { useForm, type DefaultValues, type FieldValues } from 'react-hook-form'
import type { z } from 'zod'

/** A form that is right when the schema says so: not before the first visit of a field, then at every change. */
export function useSchemaForm<In extends FieldValues, Out>(
  schema: z.ZodType<Out, In>,
  defaultValues: DefaultValues<In>,
) {
  return useForm<In, unknown, Out>({
    resolver: zodResolver(schema),
    defaultValues,
    mode: 'onTouched',
    shouldUnregister: false,
    shouldFocusError: false,
  })
}
