const STATION = /^([+-]?)(?:(\d+)\+(\d{1,2}(?:\.\d*)?|\.\d+)|(\d+(?:\.\d*)?|\.\d+))$/

/** Feet of a station as people write it: `1+15.5` is 115.5, `-0+10` is -10, `42` is 42. Anything else: undefined. */
export function parseStation(text: string): number | undefined {
  const tight = text
    .split('+')
    .map((part) => part.trim())
    .join('+')
  const parts = STATION.exec(tight)
  if (!parts) return undefined
  const [, sign, hundreds, rest, plain] = parts
  const size = plain === undefined ? Number(hundreds) * 100 + Number(rest) : Number(plain)
  return sign === '-' && size > 0 ? -size : size
}
