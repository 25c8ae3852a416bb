import Box from '@mui/material/Box'
import { useTranslation } from 'react-i18next'
import { VerdictMark } from '../../components/feedback/verdict-mark'
import { TextLink } from '../../components/layout/text-link'
import type { SigningSteps } from './signing-steps'

interface StepsListProps {
  jobId: string
  steps: SigningSteps
}

/** The steps before the signature, each done or open, by shape and by word. */
export function StepsList({ jobId, steps }: StepsListProps) {
  const { t } = useTranslation()
  const [unread] = steps.unreadPages
  const lines = [
    { isDone: true, words: t('job.stepIdentity') },
    {
      isDone: steps.hasConsented,
      words: steps.hasConsented ? t('job.stepConsent') : t('job.stepConsentOpen'),
    },
    {
      isDone: unread === undefined,
      words:
        unread === undefined ? t('job.stepRead') : t('job.stepReadOpen', { count: steps.unreadPages.length }),
    },
  ]
  return (
    <Box component="ol" sx={{ listStyle: 'none', m: 0, p: 0 }}>
      {lines.map(({ isDone, words }) => (
        <Box component="li" key={words} sx={{ py: 2, '& > span': { whiteSpace: 'normal' } }}>
          <VerdictMark kind={isDone ? 'pass' : 'waiting'} words={words} />
        </Box>
      ))}
      {unread !== undefined && (
        <Box component="li" sx={{ '& > a': { display: 'inline-flex', alignItems: 'center', minHeight: 44 } }}>
          <TextLink to={`/my/${jobId}/read/${unread}`}>{t('job.goTo', { page: unread })}</TextLink>
        </Box>
      )}
    </Box>
  )
}
