import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import type { ReactNode } from 'react'
import { useTranslation } from 'react-i18next'
import { ProblemError } from '../../api/problem-error'
import { useSharedWords } from './shared-sentences'

interface LandownerProblemProps {
  error: Error | null
  children?: ReactNode
}

/** What was refused, in the language of the page. */
export function LandownerProblem({ error, children }: LandownerProblemProps) {
  const { t } = useTranslation()
  const words = useSharedWords()
  if (error === null) return null
  const problem = error instanceof ProblemError ? error : null
  const sentences = [...(problem?.reasons ?? []), ...(problem?.fields ?? []).map(({ message }) => message)]
  return (
    <Box role="alert" sx={{ borderLeft: 4, borderColor: 'error.main', pl: 4, py: 1, my: 4 }}>
      <Typography sx={{ fontWeight: 600, color: 'error.main' }}>
        {t([`problems.${problem?.slug ?? 'other'}`, 'problems.other'])}
      </Typography>
      {[...new Set(sentences)].map((sentence) => (
        <Typography key={sentence}>{words(sentence)}</Typography>
      ))}
      {problem?.requestId && problem.status >= 500 && (
        <Typography variant="body2">{t('problems.number', { number: problem.requestId })}</Typography>
      )}
      {children}
    </Box>
  )
}
