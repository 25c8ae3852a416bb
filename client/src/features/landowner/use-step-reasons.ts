import { useTranslation } from 'react-i18next'
import { useSharedWords } from './shared-sentences'
import type { SigningSteps } from './signing-steps'

/** What still stands before the signature, one sentence a step. */
export function useStepReasons(): (steps: SigningSteps) => string[] {
  const { t } = useTranslation()
  const words = useSharedWords()
  return ({ hasConsented, unreadPages, otherReasons }) => [
    ...(hasConsented ? [] : [t('job.stepConsentOpen')]),
    ...(unreadPages.length === 0 ? [] : [t('job.stepReadOpen', { count: unreadPages.length })]),
    ...otherReasons.map(words),
  ]
}
