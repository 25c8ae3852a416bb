import { createRequire } from 'node:module'

const require = createRequire(import.meta.url)
const face = (file: string) => require.resolve(`@expo-google-fonts/source-sans-3/${file}`)

/**
 * The full font files: the subsets that are sold for web pages lack ≤ ≥ √ and print boxes in their place without
 * an error. Always set by path: a registered name opens the file anew at every change of face.
 */
export const fonts = {
  regular: face('400Regular/SourceSans3_400Regular.ttf'),
  bold: face('600SemiBold/SourceSans3_600SemiBold.ttf'),
} as const
