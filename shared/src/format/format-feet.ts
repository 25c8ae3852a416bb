import { noBreakSpace } from './no-break-space.js'
import { numberText } from './number-text.js'

/** A length or a height in decimal feet: formatFeet(17.5) is "17.5 ft". */
export const formatFeet = (valueFt: number, places = 1): string =>
  `${numberText(valueFt, places)}${noBreakSpace}ft`
