/** The colours a theme is made of. Stone and soil are fills and lines, never text. */
export interface ThemeTokens {
  paper: string
  white: string
  ink: string
  mute: string
  line: string
  inputLine: string
  wash: string
  leaf: string
  water: string
  waterDeep: string
  grass: string
  signal: string
  caution: string
  stone: string
  soil: string
}

export interface ColourPair {
  text: keyof ThemeTokens
  on: keyof ThemeTokens
  /** WCAG 2.2: 4.5 for text (1.4.3), 3 for the edge of a control (1.4.11). */
  atLeast: 4.5 | 3
}

const text = (name: keyof ThemeTokens, ...backgrounds: (keyof ThemeTokens)[]): ColourPair[] =>
  backgrounds.map((on) => ({ text: name, on, atLeast: 4.5 }))

/** Every pair in use. A component that needs another pair adds it here first. */
export const colourPairs: readonly ColourPair[] = [
  ...text('ink', 'paper', 'white', 'wash', 'leaf'),
  ...text('mute', 'paper', 'white', 'wash', 'leaf'),
  ...text('water', 'paper', 'white', 'wash', 'leaf'),
  ...text('paper', 'water', 'waterDeep', 'ink', 'signal'),
  ...text('grass', 'paper', 'white', 'leaf'),
  ...text('signal', 'paper', 'white', 'leaf'),
  ...text('caution', 'paper', 'white', 'leaf'),
  { text: 'inputLine', on: 'paper', atLeast: 3 },
  { text: 'inputLine', on: 'white', atLeast: 3 },
  { text: 'water', on: 'white', atLeast: 3 },
]
