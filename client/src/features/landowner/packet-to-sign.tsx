import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import { useTranslation } from 'react-i18next'
import { useNavigate } from 'react-router-dom'
import type { JobView, PacketView } from 'shared'
import { ActButton } from '../../components/feedback/act-button'
import { LinkButton } from '../../components/layout/link-button'
import { Section } from '../../components/layout/section'
import { ConsentForm } from './consent-form'
import { DownloadLink } from './download-link'
import { PageList } from './page-list'
import { signingSteps } from './signing-steps'
import { StepsList } from './steps-list'
import { useStepReasons } from './use-step-reasons'

interface PacketToSignProps {
  job: JobView
  packet: PacketView
}

/** The packet in force: how far one has read, what is left before signing, the PDF. */
export function PacketToSign({ job, packet }: PacketToSignProps) {
  const { t } = useTranslation()
  const navigate = useNavigate()
  const stepReasons = useStepReasons()
  const steps = signingSteps(job, packet)
  const [nextPage] = steps.unreadPages
  const readWords = nextPage === undefined ? 'readAgain' : packet.pagesReadByMe.length > 0 ? 'readOn' : 'read'
  return (
    <>
      <Typography>{t('job.packetOf', { revision: packet.revision, pages: packet.pages.length })}</Typography>
      <Box sx={{ display: 'flex', flexWrap: 'wrap', gap: 4, alignItems: 'center', mt: 3 }}>
        <LinkButton
          to={`/my/${job.id}/read/${nextPage ?? 1}`}
          words={t(`job.${readWords}`)}
          isMain={nextPage !== undefined}
        />
        <DownloadLink packetId={packet.id} words={t('job.download')} />
      </Box>
      {steps.isMyTurn && (
        <>
          <Section title={t('job.steps')}>
            <StepsList jobId={job.id} steps={steps} />
            <ActButton
              words={t('job.sign', { revision: packet.revision })}
              reasons={stepReasons(steps)}
              isMain={nextPage === undefined}
              onAct={() => void navigate(`/my/${job.id}/sign`)}
            />
          </Section>
          {!steps.hasConsented && <ConsentForm packetId={packet.id} />}
        </>
      )}
      <PageList packet={packet} />
    </>
  )
}
