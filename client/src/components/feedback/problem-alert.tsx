import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import type { ReactNode, Ref } from 'react'
import { ProblemError } from '../../api/problem-error'

interface ProblemAlertProps {
  error: Error | null
  ref?: Ref<HTMLDivElement>
  /** A way on, such as a button to load what the server has. */
  children?: ReactNode
}

/** What the server refused, in its own sentences. */
export function ProblemAlert({ error, ref, children }: ProblemAlertProps) {
  if (error === null) return null
  const problem = error instanceof ProblemError ? error : null
  const isNews = (sentence: string) => sentence !== error.message
  const reasons = (problem?.reasons ?? []).filter(isNews)
  const fields = (problem?.fields ?? []).map(({ message }) => message).filter(isNews)
  return (
    <Box
      ref={ref}
      role="alert"
      tabIndex={-1}
      sx={{ borderLeft: 4, borderColor: 'error.main', pl: 4, py: 1, my: 4, maxWidth: 720 }}
    >
      <Typography sx={{ fontWeight: 600, color: 'error.main' }}>
        {problem?.title ?? 'Something went wrong here'}
      </Typography>
      {error.message !== problem?.title && <Typography>{error.message}</Typography>}
      {reasons.length > 0 && <Sentences sentences={reasons} />}
      {fields.length > 0 && <Sentences sentences={fields} />}
      {problem?.requestId && problem.status >= 500 && (
        <Typography variant="body2" sx={{ color: 'text.secondary' }}>
          Tell the office this number: {problem.requestId}
        </Typography>
      )}
      {children}
    </Box>
  )
}

function Sentences({ sentences }: { sentences: readonly string[] }) {
  return (
    <Box component="ul" sx={{ m: 0, pl: 5 }}>
      {[...new Set(sentences)].map((sentence) => (
        <li key={sentence}>{sentence}</li>
      ))}
    </Box>
  )
}
