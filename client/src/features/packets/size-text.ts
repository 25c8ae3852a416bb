import { noBreakSpace, numberText, trimmedNumber } from 'shared'

/** The size of a file: whole kB below one MB. */
export const sizeText = (bytes: number): string =>
  bytes < 1e6
    ? `${numberText(bytes / 1e3)}${noBreakSpace}kB`
    : `${trimmedNumber(bytes / 1e6, 1)}${noBreakSpace}MB`
