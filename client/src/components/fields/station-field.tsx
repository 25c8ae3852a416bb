import { formatStation, parseStation } from 'shared'
import type { FieldWords } from './field-frame'
import { NumberField } from './number-field'

interface StationFieldProps extends FieldWords {
  name: string
  isOptional?: boolean
}

const writeStation = (stationFt: number): string => {
  const decimals = Number.isInteger(stationFt) ? 0 : 2
  return formatStation({ stationFt, decimals })
}

/** A place along the line, typed as 0+40 or 40. */
export function StationField(props: StationFieldProps) {
  return <NumberField {...props} parse={parseStation} write={writeStation} />
}
