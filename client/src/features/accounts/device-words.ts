/** In this order: a browser also names those it is like. */
const browsers: readonly (readonly [RegExp, string])[] = [
  [/Edg(e|A|iOS)?\//, 'Edge'],
  [/OPR\//, 'Opera'],
  [/SamsungBrowser\//, 'Samsung Internet'],
  [/Firefox\/|FxiOS\//, 'Firefox'],
  [/Chrom(e|ium)\/|CriOS\//, 'Chrome'],
  [/Safari\//, 'Safari'],
]

const devices: readonly (readonly [RegExp, string])[] = [
  [/iPad/, 'iPad'],
  [/iPhone/, 'iPhone'],
  [/Android/, 'Android'],
  [/Windows/, 'Windows'],
  [/Mac OS X|Macintosh/, 'Mac'],
  [/CrOS/, 'Chromebook'],
  [/Linux/, 'Linux'],
]

const named = (list: typeof browsers, text: string): string | undefined =>
  list.find(([pattern]) => pattern.test(text))?.[1]

/** What a browser says of itself, as a person would say it; as it stands where it is not known. */
export function deviceWords(userAgent: string): string {
  const browser = named(browsers, userAgent)
  const device = named(devices, userAgent)
  if (browser === undefined) return userAgent || 'not named'
  return device === undefined ? browser : `${browser} on ${device}`
}
