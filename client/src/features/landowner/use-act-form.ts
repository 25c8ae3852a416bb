import { useForm, type DefaultValues, type FieldErrors, type Resolver } from 'react-hook-form'
import { actSchema, type Act } from 'shared'
import { useSharedWords } from './shared-sentences'

/** Everything a landowner types before an act, as it stands in the boxes. */
export interface ActFields {
  action: Act['action']
  typedName?: string
  intends?: boolean
  packetSha256?: string
  note?: string
  page?: number
  reason?: string
}

/** A form of one act of a landowner: right when the schema of shared says so, told in the language of the page. */
export function useActForm(defaultValues: DefaultValues<ActFields>) {
  const words = useSharedWords()
  const resolver: Resolver<ActFields, unknown, Act> = (fields) => {
    const read = actSchema.safeParse(fields)
    if (read.success) return { values: read.data, errors: {} }
    const errors: FieldErrors<ActFields> = Object.fromEntries(
      read.error.issues.map(({ path, code, message }) => [
        path.join('.'),
        { type: code, message: words(message) },
      ]),
    )
    return { values: {}, errors }
  }
  return useForm<ActFields, unknown, Act>({ resolver, defaultValues, mode: 'onTouched' })
}
