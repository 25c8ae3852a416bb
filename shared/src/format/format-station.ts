/** A station in feet as people write it: 115.5 with one decimal is `1+15.5`, -10 is `-0+10`. */
export function formatStation({ stationFt, decimals = 0 }: { stationFt: number; decimals?: number }): string {
  const size = Number(Math.abs(stationFt).toFixed(decimals))
  const hundreds = Math.floor(size / 100)
  const rest = (size - hundreds * 100).toFixed(decimals)
  const width = decimals > 0 ? decimals + 3 : 2
  const sign = stationFt < 0 && size > 0 ? '-' : ''
  return `${sign}${hundreds}+${rest.padStart(width, '0')}`
}
