// Writes the table of glyph widths from the very font files that the packet embeds, so that the drawings
// can place their labels without a renderer. Run again only when the font package changes.
import { writeFileSync } from 'node:fs'
import { createRequire } from 'node:module'
import { fileURLToPath } from 'node:url'

const require = createRequire(new URL('../server/package.json', import.meta.url))
const fontkit = require('fontkit')
const package_ = '@expo-google-fonts/source-sans-3'
const faces = {
  regular: '400Regular/SourceSans3_400Regular.ttf',
  bold: '600SemiBold/SourceSans3_600SemiBold.ttf',
}
// Latin with accents, and the signs a drawing needs: primes, degree, powers, fractions, comparisons, arrows.
const codes = [
  [0x20, 0x7e],
  [0xa0, 0x17f],
].flatMap(([from, to]) => Array.from({ length: to - from + 1 }, (_, index) => from + index))
const signs = [...'–—‘’“”•…′″⁄→←↑↓−√≈≠≤≥∑∞△▽θΔΣ']

const advances = (path) => {
  const font = fontkit.openSync(require.resolve(`${package_}/${path}`))
  const all = [...codes.map((code) => String.fromCodePoint(code)), ...signs]
  const known = all.filter((sign) => font.hasGlyphForCodePoint(sign.codePointAt(0)))
  return Object.fromEntries(
    known.map((sign) => [
      sign,
      Math.round((font.glyphForCodePoint(sign.codePointAt(0)).advanceWidth / font.unitsPerEm) * 1000),
    ]),
  )
}

const table = Object.fromEntries(Object.entries(faces).map(([name, path]) => [name, advances(path)]))
const pack = (widths) =>
  Object.entries(
    Object.entries(widths).reduce((byWidth, [sign, width]) => {
      byWidth[width] = (byWidth[width] ?? '') + sign
      return byWidth
    }, {}),
  )
const body = Object.entries(table)
  .map(([name, widths]) => {
    const rows = pack(widths).map(([width, signs_]) => `    [${width}, ${JSON.stringify(signs_)}],`)
    return `  ${name}: [\n${rows.join('\n')}\n  ],`
  })
  .join('\n')
const text = `/**
 * Advance widths of Source Sans 3 in thousandths of the type size: [width, every sign of that width].
 * Made by scripts/make-font-advances.mjs from the font files that the packet embeds; do not edit by hand.
 */
export const fontAdvances = {
${body}
} as const
`
const target = fileURLToPath(new URL('../shared/src/drawing/font-advances.ts', import.meta.url))
writeFileSync(target, text)
console.log(`Wrote ${target}`)
