import type { ThemeTokens } from './theme-tokens'

/** Field-book paper by daylight. Every pair that carries text is checked in contrast.test.ts. */
export const lightTokens: ThemeTokens = {
  paper: '#FBFAF6',
  white: '#FFFFFF',
  ink: '#22302B',
  mute: '#566059',
  line: '#C9CEC4',
  inputLine: '#6B756E',
  wash: '#E6EFF0',
  leaf: '#EEECE3',
  water: '#2B6F86',
  waterDeep: '#1F5466',
  grass: '#4F6A2E',
  signal: '#B3261E',
  caution: '#8A5C00',
  stone: '#7C7468',
  soil: '#A5713F',
}
