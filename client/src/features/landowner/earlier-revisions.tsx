import Box from '@mui/material/Box'
import { useTranslation } from 'react-i18next'
import type { JobView } from 'shared'
import { Instant } from '../../components/layout/instant'
import { Section } from '../../components/layout/section'
import { DownloadLink } from './download-link'

interface EarlierRevisionsProps {
  job: JobView
}

/** Older packets stay readable, with signatures that no longer count in plain sight. */
export function EarlierRevisions({ job }: EarlierRevisionsProps) {
  const { t } = useTranslation()
  const earlier = job.revisions.filter(({ packetId }) => packetId !== job.packetId)
  if (earlier.length === 0) return null
  return (
    <Section title={t('job.earlier')}>
      {earlier.map(({ number, packetId, madeAt, signatures }) => (
        <Box key={packetId} sx={{ py: 2, borderBottom: 1, borderColor: 'divider' }}>
          {t('job.earlierOf', { revision: number })} <Instant at={madeAt} />
          {signatures.map(({ name, signedAt, isVoid }) => (
            <Box key={`${name} ${signedAt}`} sx={{ color: 'text.secondary' }}>
              {isVoid ? <s>{name}</s> : name}
              {isVoid && `, ${t('job.void')}`}
            </Box>
          ))}
          <div>
            <DownloadLink packetId={packetId} words={t('job.download')} />
          </div>
        </Box>
      ))}
    </Section>
  )
}
