import Typography from '@mui/material/Typography'
import { useTranslation } from 'react-i18next'
import type { JobView, PacketView } from 'shared'
import { VerdictMark } from '../../components/feedback/verdict-mark'
import { FigureRow, FigureRows } from '../../components/layout/figure-rows'
import { Section } from '../../components/layout/section'
import { packetMoney } from './packet-money'

interface WhatIsSignedProps {
  job: JobView
  packet: PacketView
}

/** The revision, its pages, its money and its fingerprint: what a name is put under. */
export function WhatIsSigned({ job, packet }: WhatIsSignedProps) {
  const { t } = useTranslation()
  const money = packetMoney(packet)
  const read = packet.pagesReadByMe.length
  const isAllRead = read >= packet.pages.length
  return (
    <Section title={t('sign.what')}>
      <Typography sx={{ my: 3 }}>
        <strong>{job.title}</strong>.{' '}
        {t('job.packetOf', { revision: packet.revision, pages: packet.pages.length })}
      </Typography>
      <FigureRows>
        <FigureRow
          label={t('job.pages')}
          value={
            <VerdictMark
              kind={isAllRead ? 'pass' : 'waiting'}
              words={t('job.pagesRead', { read, all: packet.pages.length })}
            />
          }
        />
        {money && <FigureRow label={t('sign.whole')} value={money.whole} />}
        {money && <FigureRow label={t('sign.funds')} value={`−${money.funds}`} />}
        {money && <FigureRow label={t('sign.share')} value={money.share} isSum />}
      </FigureRows>
      <Typography variant="body2" sx={{ color: 'text.secondary', mt: 3, overflowWrap: 'anywhere' }}>
        {t('sign.fingerprint')}: {packet.sha256}
      </Typography>
    </Section>
  )
}
