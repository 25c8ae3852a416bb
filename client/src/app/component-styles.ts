import type { Components, Theme } from '@mui/material/styles'
import type { ThemeTokens } from './theme-tokens'

const focusRing = (tokens: ThemeTokens) => ({ outline: `2px solid ${tokens.water}`, outlineOffset: 2 })

const visuallyHidden = {
  position: 'absolute',
  width: 1,
  height: 1,
  overflow: 'hidden',
  clipPath: 'inset(50%)',
  whiteSpace: 'nowrap',
} as const

type Styles = Components<Omit<Theme, 'components'>>

const pageStyles = (tokens: ThemeTokens): Styles['MuiCssBaseline'] => ({
  styleOverrides: {
    ':root': { '--paper': tokens.paper, '--line': tokens.line, '--ink': tokens.ink },
    html: { scrollPaddingTop: 64 },
    '.figure': { fontVariantNumeric: 'tabular-nums lining-nums' },
    '.visually-hidden': visuallyHidden,
    body: { fontVariantNumeric: 'lining-nums', overflowWrap: 'break-word' },
    a: { color: tokens.water },
    ':focus-visible': focusRing(tokens),
    'h1:focus': { outline: 'none' },
    '@media (prefers-reduced-motion: reduce)': { '*': { animation: 'none !important' } },
  },
})

const buttonStyles = (tokens: ThemeTokens): Styles['MuiButton'] => ({
  defaultProps: { disableElevation: true, variant: 'outlined', color: 'inherit' },
  styleOverrides: {
    root: {
      minHeight: 36,
      padding: '6px 16px',
      whiteSpace: 'normal',
      '&.Mui-focusVisible': focusRing(tokens),
      '@media (pointer: coarse)': { minHeight: 44 },
    },
    outlined: { borderColor: tokens.ink },
    text: {
      textDecoration: 'underline',
      textUnderlineOffset: 3,
      color: tokens.water,
      padding: '6px 4px',
      marginLeft: -4,
      minWidth: 0,
    },
  },
})

const inputStyles = (tokens: ThemeTokens): Styles['MuiInputBase'] => ({
  styleOverrides: {
    root: {
      background: tokens.white,
      border: `1px solid ${tokens.inputLine}`,
      borderRadius: 2,
      padding: '0 10px',
      minHeight: 38,
      '@media (pointer: coarse)': { minHeight: 46 },
      '&.Mui-focused': { borderColor: tokens.water, boxShadow: `0 0 0 1px ${tokens.water}` },
      '&.Mui-error': { borderColor: tokens.signal, boxShadow: `0 0 0 1px ${tokens.signal}` },
    },
    input: { padding: '6px 0', '&:focus-visible': { outline: 'none' } },
  },
})

/** What every control of MUI looks like on paper. */
export function componentStyles(tokens: ThemeTokens): Styles {
  const ring = focusRing(tokens)
  return {
    MuiCssBaseline: pageStyles(tokens),
    MuiButtonBase: { defaultProps: { disableRipple: true } },
    MuiButton: buttonStyles(tokens),
    MuiPaper: { defaultProps: { elevation: 0 } },
    MuiDialog: {
      styleOverrides: { paper: { border: `1px solid ${tokens.ink}`, margin: 16, boxShadow: 'none' } },
    },
    MuiInputBase: inputStyles(tokens),
    MuiNativeSelect: { styleOverrides: { select: { paddingRight: '24px', minHeight: 0 } } },
    MuiTableCell: {
      styleOverrides: {
        root: { borderBottom: `1px solid ${tokens.line}`, padding: '7px 12px 7px 0', verticalAlign: 'top' },
        head: { borderBottom: `1px solid ${tokens.ink}`, fontSize: '0.8125rem', color: tokens.mute },
      },
    },
    MuiLink: { defaultProps: { underline: 'always' } },
    MuiCheckbox: { styleOverrides: { root: { '&.Mui-focusVisible': ring } } },
    MuiLinearProgress: { styleOverrides: { root: { background: tokens.line, height: 3 } } },
  }
}
