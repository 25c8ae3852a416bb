import { useCallback, useEffect, useState } from 'react'
import { get, type DefaultValues, type FieldValues, type Path, type PathValue } from 'react-hook-form'
import { flushSync } from 'react-dom'
import type { z } from 'zod'
import { useSchemaForm } from './use-schema-form'

/**
 * A form of something that exists already. Undefined makes a field fall back, on its default or on the value it was
 * first drawn with, so nothing could ever be emptied. Hence values are filled in instead of given as defaults, and a
 * field that is emptied holds null, which `withoutEmpty` leaves out again. The first drawing has no values yet.
 */
export function useFilledForm<In extends FieldValues, Out>(schema: z.ZodType<Out, In>, values: In) {
  const form = useSchemaForm<In, Out>(schema, {} as DefaultValues<In>)
  const { reset, getValues, setValue, subscribe } = form
  const [first] = useState(values)
  const fill = useCallback((next: In) => reset(next, { keepDefaultValues: true }), [reset])

  useEffect(() => fill(first), [fill, first])
  useEffect(
    () =>
      subscribe({
        formState: { values: true },
        callback: ({ name, values: typed }) => {
          if (name === undefined || get(typed, name) !== undefined) return
          // Later, because fields that hear of this change after us would fall back again.
          queueMicrotask(() => {
            if (getValues(name as Path<In>) !== undefined) return
            // At once, so that the old value is not seen, nor typed into, in between.
            flushSync(() => setValue(name as Path<In>, null as PathValue<In, Path<In>>))
          })
        },
      }),
    [subscribe, getValues, setValue],
  )
  return { form, fill }
}
