import { createTheme, type Theme } from '@mui/material/styles'
import { componentStyles } from './component-styles'
import type { ThemeTokens } from './theme-tokens'

declare module '@mui/material/styles' {
  interface Theme {
    tokens: ThemeTokens
  }
  interface ThemeOptions {
    tokens: ThemeTokens
  }
}

const size = (px: number, line: number) => ({ fontSize: `${px / 16}rem`, lineHeight: line / px })

/** The field book: paper, ink, hairlines, square corners, one accent. */
export function makeTheme(tokens: ThemeTokens): Theme {
  return createTheme({
    tokens,
    palette: {
      mode: 'light',
      primary: { main: tokens.water, dark: tokens.waterDeep, contrastText: tokens.paper },
      error: { main: tokens.signal },
      warning: { main: tokens.caution },
      success: { main: tokens.grass },
      text: { primary: tokens.ink, secondary: tokens.mute },
      background: { default: tokens.paper, paper: tokens.paper },
      divider: tokens.line,
    },
    shape: { borderRadius: 2 },
    spacing: 4,
    typography: {
      fontFamily: '"Source Sans 3", "Source Sans Pro", "Noto Sans", "DejaVu Sans", system-ui, sans-serif',
      fontWeightRegular: 400,
      fontWeightMedium: 600,
      fontWeightBold: 600,
      h1: { ...size(24, 32), fontWeight: 600 },
      h2: { ...size(18, 24), fontWeight: 600 },
      h3: { ...size(15, 20), fontWeight: 600 },
      body1: size(15, 20),
      body2: size(13, 18),
      button: { ...size(15, 20), fontWeight: 600, textTransform: 'none' },
    },
    transitions: { create: () => 'none' },
    components: componentStyles(tokens),
  })
}
