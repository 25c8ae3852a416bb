const GROUPED = /^[+-]?\d{1,3}([, ]\d{3})+(\.\d+)?$/
const PLAIN = /^[+-]?(\d+\.?\d*|\.\d+)$/
const FEET_INCHES = /^([+-]?\d+)\s*(?:'|′|ft)\s*-?\s*(\d+(?:\.\d*)?)\s*(?:"|″|in)?$/
const RATIO = /^(\d+\.?\d*|\.\d+)\s*:\s*1$/
/** A unit after the number says what the label says already. */
const TRAILING_UNIT = /\s*(%|°?[a-z²³/ ]+|'|′|"|″)$/i

/**
 * The number a person meant: `1,250`, `1 250`, `12.5 ft`, `12'6"`, `6 : 1`, `10 %`. Anything that could mean two
 * things, such as `12,5`, is not guessed: undefined.
 */
export function parseQuantity(typed: string): number | undefined {
  const text = typed
    .trim()
    .replace(/[\u2212\u2013]/g, '-')
    .replace(/\u00a0/g, ' ')
  const feet = FEET_INCHES.exec(text)
  if (feet) {
    const whole = Number(feet[1])
    const part = Number(feet[2]) / 12
    return text.startsWith('-') ? whole - part : whole + part
  }
  const ratio = RATIO.exec(text)
  if (ratio) return Number(ratio[1])
  const bare = text.replace(TRAILING_UNIT, '')
  if (PLAIN.test(bare)) return Number(bare)
  if (GROUPED.test(bare)) return Number(bare.replace(/[, ]/g, ''))
  return undefined
}
