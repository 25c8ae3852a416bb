/** A number with so many decimals and commas between thousands: numberText(1409.27, 1) is "1,409.3". */
export function numberText(value: number, places = 0): string {
  const fixed = Math.abs(value).toFixed(places)
  const [whole = '0', decimals] = fixed.split('.')
  const grouped = whole.replace(/\B(?=(\d{3})+$)/g, ',')
  const isZero = Number(fixed) === 0
  const sign = value < 0 && !isZero ? '−' : ''
  return `${sign}${grouped}${decimals ? `.${decimals}` : ''}`
}
