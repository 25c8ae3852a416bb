import { useQuery } from '@tanstack/react-query'
import { useParams } from 'react-router-dom'
import type { JobView } from 'shared'
import { jobQuery } from '../api/jobs'
import { packetQuery } from '../api/packets'
import { QueryGate } from '../components/feedback/query-gate'
import { Page } from '../components/layout/page'
import { Section } from '../components/layout/section'
import { TextLink } from '../components/layout/text-link'
import { useJobFrameLock } from '../features/jobs/job-frame-lock'
import { JobOverviewRevisions } from '../features/jobs/job-overview-revisions'
import { MakePacket } from '../features/packets/make-packet'
import { PacketFacts } from '../features/packets/packet-facts'
import { PacketPages } from '../features/packets/packet-pages'
import { PacketState } from '../features/packets/packet-state'
import { SendToLandowner } from '../features/packets/send-to-landowner'
import { SignatureList } from '../features/packets/signature-list'
import { TechnicalCheck } from '../features/packets/technical-check'
import { isUnderWay } from '../features/packets/use-packet'

export function PacketPage() {
  const { jobId = '' } = useParams()
  const query = useQuery(jobQuery(jobId))
  return (
    <Page
      title="Packet"
      maxWidth={1100}
      action={<TextLink to={`/jobs/${jobId}/notes`}>Notes on this packet</TextLink>}
    >
      <QueryGate query={query}>{(job) => <PacketOfJob job={job} />}</QueryGate>
    </Page>
  )
}

function PacketOfJob({ job }: { job: JobView }) {
  const makeLock = useJobFrameLock(job, 'packet:make')
  const checkLock = useJobFrameLock(job, 'packet:check')
  const { packetId, revisions } = job
  const packet = useQuery({ ...packetQuery(packetId ?? ''), enabled: packetId !== null })
  const isMade = revisions.some((revision) => revision.packetId === packetId && revision.sha256 !== null)
  return (
    <>
      {packetId !== null && (
        <PacketState packetId={packetId} isJobBehind={!isMade}>
          {(made) => (
            <>
              <PacketFacts packet={made} />
              <Section title="Pages" aside="Each opens the PDF at that page">
                <PacketPages packet={made} />
              </Section>
              <TechnicalCheck packet={made} designerName={job.designerName} lock={checkLock} />
              <SendToLandowner job={job} />
              {made.signatures.length > 0 && (
                <Section title="Signatures">
                  <SignatureList signatures={made.signatures} />
                </Section>
              )}
            </>
          )}
        </PacketState>
      )}
      {!(packet.data && isUnderWay(packet.data)) && (
        <Section title={packetId === null ? 'Make the packet' : 'Make it anew'}>
          <MakePacket
            job={job}
            lock={makeLock}
            isMain={packetId === null || packet.data?.status === 'failed'}
          />
        </Section>
      )}
      {packetId === null && <SendToLandowner job={job} />}
      <Section title="Revisions">
        <JobOverviewRevisions revisions={revisions} />
      </Section>
    </>
  )
}
