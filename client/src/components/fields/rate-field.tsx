import { NumberTextField } from './number-text-field'
import type { FieldWords } from './field-frame'

interface RateFieldProps extends FieldWords {
  name: string
  isOptional?: boolean
}

const tidyRate = (typed: string): string => typed.replace(/[$,\s]/g, '')

/** Dollars a unit, up to four places; a string all the way. */
export function RateField(props: RateFieldProps) {
  return <NumberTextField {...props} tidy={tidyRate} />
}
