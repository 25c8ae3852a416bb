/** A length as it is written on a drawing: feetAndInches(17.5) is 17′-6″. Rounds to whole inches unless told. */
export function feetAndInches(lengthFt: number, partsOfInch: 1 | 2 | 4 = 1): string {
  const parts = Math.round(Math.abs(lengthFt) * 12 * partsOfInch)
  const feet = Math.floor(parts / (12 * partsOfInch))
  const rest = parts - feet * 12 * partsOfInch
  const inches = Math.floor(rest / partsOfInch)
  const fraction = fractions[((rest - inches * partsOfInch) * 4) / partsOfInch] ?? ''
  const sign = lengthFt < 0 && parts > 0 ? '−' : ''
  const inchText = fraction && inches === 0 ? fraction : `${inches}${fraction}`
  return `${sign}${feet}′-${inchText}″`
}

const fractions = ['', '¼', '½', '¾']
