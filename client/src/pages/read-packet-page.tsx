import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import { Navigate, useParams } from 'react-router-dom'
import type { JobView, PacketView } from 'shared'
import { TextLink } from '../components/layout/text-link'
import { LandownerPage } from '../features/landowner/landowner-page'
import { LinkRow } from '../features/landowner/link-row'
import { MyPacket } from '../features/landowner/my-packet'
import { PageReader } from '../features/landowner/page-reader'
import { PageTurn } from '../features/landowner/page-turn'
import { PdfView } from '../features/landowner/pdf-view'
import { offeredAct, signingSteps } from '../features/landowner/signing-steps'

export function ReadPacketPage() {
  return (
    <MyPacket>
      {(job, packet) =>
        packet?.status === 'ready' ? (
          <ReadPage job={job} packet={packet} />
        ) : (
          <Navigate to={`/my/${job.id}`} />
        )
      }
    </MyPacket>
  )
}

interface ReadPageProps {
  job: JobView
  packet: PacketView
}

function ReadPage({ job, packet }: ReadPageProps) {
  const { t } = useTranslation()
  const params = useParams()
  const [isPdfShown, setIsPdfShown] = useState(false)
  const page = packet.pages.find(({ number }) => String(number) === params.page)
  if (page === undefined) return <Navigate to={`/my/${job.id}`} replace />
  const { number, title } = page
  const { isMyTurn } = signingSteps(job, packet)
  return (
    <LandownerPage
      key={number}
      title={t('read.title', { page: number, all: packet.pages.length, name: title })}
    >
      <PageReader packet={packet} page={page} />
      <PdfView
        packetId={packet.id}
        page={number}
        title={title}
        isShown={isPdfShown}
        onToggle={() => setIsPdfShown(!isPdfShown)}
      />
      <LinkRow>
        <TextLink to={`/my/${job.id}`}>{t('read.back')}</TextLink>
        {offeredAct(job, 'ask-for-changes')?.enabled && (
          <TextLink to={`/my/${job.id}/ask?page=${number}`}>{t('read.askAbout')}</TextLink>
        )}
      </LinkRow>
      <PageTurn
        jobId={job.id}
        page={number}
        last={packet.pages.length}
        signWords={isMyTurn ? t('job.sign', { revision: packet.revision }) : null}
      />
    </LandownerPage>
  )
}
