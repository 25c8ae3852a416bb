import { useTranslation } from 'react-i18next'
import type { JobAction, JobView } from 'shared'
import { Section } from '../../components/layout/section'
import { TextLink } from '../../components/layout/text-link'
import { LinkRow } from './link-row'
import { offeredAct } from './signing-steps'

interface OtherAct {
  action: JobAction
  place: string
  words: string
}

const otherActs: readonly OtherAct[] = [
  { action: 'ask-for-changes', place: 'ask', words: 'job.ask' },
  { action: 'take-signature-back', place: 'take-back', words: 'job.takeBack' },
  { action: 'withdraw', place: 'withdraw', words: 'job.withdraw' },
]

interface OtherActsProps {
  job: JobView
}

/** The ways beside signing that this job offers this person now. */
export function OtherActs({ job }: OtherActsProps) {
  const { t } = useTranslation()
  const open = otherActs.filter(({ action }) => offeredAct(job, action)?.enabled)
  if (open.length === 0) return null
  return (
    <Section title={t('job.otherActs')}>
      <LinkRow>
        {open.map(({ place, words }) => (
          <TextLink key={place} to={`/my/${job.id}/${place}`}>
            {t(words)}
          </TextLink>
        ))}
      </LinkRow>
    </Section>
  )
}
