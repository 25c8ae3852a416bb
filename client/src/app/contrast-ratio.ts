const channel = (value: number): number => {
  const share = value / 255
  return share <= 0.04045 ? share / 12.92 : ((share + 0.055) / 1.055) ** 2.4
}

const relativeLuminance = (hex: string): number => {
  const part = (start: number) => channel(Number.parseInt(hex.slice(start, start + 2), 16))
  return 0.2126 * part(1) + 0.7152 * part(3) + 0.0722 * part(5)
}

/** Contrast of two colours as #RRGGBB, by WCAG 2.2 "contrast ratio" and "relative luminance". */
export function contrastRatio(one: string, other: string): number {
  const [darker, lighter] = [relativeLuminance(one), relativeLuminance(other)].sort((a, b) => a - b)
  return ((lighter ?? 0) + 0.05) / ((darker ?? 0) + 0.05)
}
