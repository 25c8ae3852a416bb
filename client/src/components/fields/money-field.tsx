import { NumberTextField } from './number-text-field'
import type { FieldWords } from './field-frame'

interface MoneyFieldProps extends FieldWords {
  name: string
  isOptional?: boolean
}

/** Dollars and cents stay a string, since money is never a float. `72.5` becomes `72.50` on leaving the box. */
const tidyMoney = (typed: string): string => {
  const bare = typed.replace(/[$,\s]/g, '')
  if (/^\d{1,12}$/.test(bare)) return `${bare}.00`
  return /^\d{1,12}\.\d$/.test(bare) ? `${bare}0` : bare
}

export function MoneyField(props: MoneyFieldProps) {
  return <NumberTextField {...props} unit={props.unit ?? '$'} tidy={tidyMoney} />
}
