import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import { useTranslation } from 'react-i18next'
import type { JobView, PacketView } from 'shared'
import { useSession } from '../../api/session-context'
import { EmptyState } from '../../components/feedback/empty-state'
import { Section } from '../../components/layout/section'
import { DownloadLink } from './download-link'
import { EarlierRevisions } from './earlier-revisions'
import { NoteList } from './note-list'
import { OtherActs } from './other-acts'
import { PacketToSign } from './packet-to-sign'
import { SignatureList } from './signature-list'
import { signingSteps } from './signing-steps'

interface MyJobProps {
  job: JobView
  packet: PacketView | null
}

/** Where the job stands, what waits for this person, and everything that was sent. */
export function MyJob({ job, packet }: MyJobProps) {
  const { t } = useTranslation()
  const { district } = useSession()
  const isMyTurn = packet !== null && signingSteps(job, packet).isMyTurn
  return (
    <>
      <Typography sx={{ color: 'text.secondary' }}>
        {t('job.numberAt', { number: job.number, district: district.name })}
      </Typography>
      <Typography sx={{ mt: 2, fontWeight: 600 }}>
        {isMyTurn
          ? t('job.yourTurn')
          : `${t('job.notYourTurn', { state: t(`states.${job.state}`) })} ${t('job.waitsFor', { who: t(`waits.${job.state}`) })}`}
      </Typography>
      <Box role="note" sx={{ borderLeft: 4, borderColor: 'warning.main', pl: 3, my: 4 }}>
        {t('job.noStart')}
      </Box>
      {job.finalPacketId !== null && (
        <Section title={t('job.finalPacket')}>
          <Typography sx={{ mt: 2 }}>{t('job.finalPacketHow')}</Typography>
          <DownloadLink packetId={job.finalPacketId} words={t('job.download')} />
        </Section>
      )}
      <PacketPart job={job} packet={packet} />
      {packet !== null && <SignatureList signatures={packet.signatures} />}
      <NoteList jobId={job.id} />
      <EarlierRevisions job={job} />
      <OtherActs job={job} />
      <Typography variant="body2" sx={{ mt: 6 }}>
        {job.designerName !== null && t('job.questions', { name: job.designerName, district: district.name })}{' '}
        {t('job.digging')}
      </Typography>
    </>
  )
}

function PacketPart({ job, packet }: MyJobProps) {
  const { t } = useTranslation()
  if (packet === null) {
    return <EmptyState title={t('job.noPacket')}>{t('job.noPacketHow')}</EmptyState>
  }
  if (packet.status === 'ready') return <PacketToSign job={job} packet={packet} />
  return (
    <Typography role="status" sx={{ my: 6 }}>
      {packet.status === 'failed' ? t('job.failed') : t('job.making')}
    </Typography>
  )
}
