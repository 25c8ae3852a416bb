import { useTranslation } from 'react-i18next'
import type { JobView } from 'shared'
import { EmptyState } from '../../components/feedback/empty-state'
import { LinkButton } from '../../components/layout/link-button'

interface NotNowProps {
  job: JobView
  title: string
  /** Other words than where the job stands. */
  sentence?: string
}

/** An act that this job does not offer to this person now, with the way back. */
export function NotNow({ job, title, sentence }: NotNowProps) {
  const { t } = useTranslation()
  return (
    <EmptyState title={title} action={<LinkButton to={`/my/${job.id}`} words={t('sign.doneAgain')} isMain />}>
      {sentence ?? t('job.whereItStands', { state: t(`states.${job.state}`) })}
    </EmptyState>
  )
}
