import Box from '@mui/material/Box'
import type { Verdict } from 'shared'

export type MarkKind = Verdict | 'waiting'

interface MarkLook {
  word: string
  colour: string
  path: string
  isFilled?: boolean
  dash?: string
}

const marks: Record<MarkKind, MarkLook> = {
  pass: { word: 'holds', colour: 'success.main', path: 'M2.5 8.5l3.5 3.5 7-8' },
  caution: { word: 'caution', colour: 'warning.main', path: 'M8 2.5l6 11H2zM8 6.5v3.5M8 11.5v.5' },
  fail: { word: 'fails', colour: 'error.main', path: 'M2 2h12v12H2z', isFilled: true },
  'not-applicable': { word: 'does not apply', colour: 'text.secondary', path: 'M3 8h10' },
  waiting: {
    word: 'waiting',
    colour: 'text.secondary',
    path: 'M8 2.5a5.5 5.5 0 1 1 0 11a5.5 5.5 0 1 1 0-11',
    dash: '2.5 2',
  },
}

interface VerdictMarkProps {
  kind: MarkKind
  /** Other words beside the shape, such as "14 hold". */
  words?: string
  /** Shape alone where the word stands elsewhere; it is still told to screen readers. */
  isShapeOnly?: boolean
}

/** A verdict by shape, word and colour together, never by colour alone. */
export function VerdictMark({ kind, words, isShapeOnly = false }: VerdictMarkProps) {
  const look = marks[kind]
  return (
    <Box
      component="span"
      sx={{
        display: 'inline-flex',
        alignItems: 'center',
        gap: 1.5,
        color: look.colour,
        whiteSpace: 'nowrap',
      }}
    >
      <svg width="15" height="15" viewBox="0 0 16 16" aria-hidden focusable="false">
        <path
          d={look.path}
          fill={look.isFilled ? 'currentColor' : 'none'}
          stroke="currentColor"
          strokeWidth="1.8"
          strokeDasharray={look.dash}
        />
        {look.isFilled && <path d="M5 5l6 6M11 5l-6 6" stroke="var(--paper)" strokeWidth="1.8" fill="none" />}
      </svg>
      <span className={isShapeOnly ? 'visually-hidden' : undefined}>{words ?? look.word}</span>
    </Box>
  )
}
