/** A decimal string of dollars for people: moneyText("6564.45") is "$6,564.45". Nothing is rounded. */
export function moneyText(money: string): string {
  const isNegative = money.startsWith('-')
  const [whole = '0', cents = '00'] = money.replace('-', '').split('.')
  return `${isNegative ? '−' : ''}$${whole.replace(/\B(?=(\d{3})+$)/g, ',')}.${cents}`
}
