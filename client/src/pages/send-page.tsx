import Typography from '@mui/material/Typography'
import { useQuery } from '@tanstack/react-query'
import { useParams } from 'react-router-dom'
import { stateWords, type JobView } from 'shared'
import { jobQuery, mailQuery } from '../api/jobs'
import { useMay } from '../api/session-context'
import { EmptyState } from '../components/feedback/empty-state'
import { QueryGate } from '../components/feedback/query-gate'
import { Page } from '../components/layout/page'
import { Section } from '../components/layout/section'
import { Addressees } from '../features/mail/addressees'
import { MailList } from '../features/mail/mail-list'
import { SendLinksAgain } from '../features/mail/send-links-again'
import { SendPacketForm } from '../features/mail/send-packet-form'
import { PacketFacts } from '../features/packets/packet-facts'
import { PacketState } from '../features/packets/packet-state'

export function SendPage() {
  const { jobId = '' } = useParams()
  const may = useMay()
  const query = useQuery(jobQuery(jobId))
  return (
    <Page title="Send" maxWidth={960}>
      <QueryGate query={query}>
        {(job) => (
          <>
            <FinalPacket job={job} />
            <SendLinksAgain job={job} />
          </>
        )}
      </QueryGate>
      {may('mail:read') && <MailOfJob jobId={jobId} />}
    </Page>
  )
}

function FinalPacket({ job }: { job: JobView }) {
  const offered = job.actions.find(({ action }) => action === 'send')
  if (job.finalPacketId === null) {
    return (
      <EmptyState title="There is nothing to send yet">
        The packet with signatures and evidence is made when a supervisor approves. The job is{' '}
        {stateWords[job.state]}.
      </EmptyState>
    )
  }
  return (
    <>
      <Section title="Approved packet" aside="With signatures and evidence">
        <PacketState packetId={job.finalPacketId} isJobBehind={offered !== undefined && !offered.enabled}>
          {(packet) => <PacketFacts packet={packet} />}
        </PacketState>
      </Section>
      <Section title="To whom">
        <Addressees producers={job.producers} />
        <SendPacketForm job={job} />
        {!offered && (
          <Typography role="status" sx={{ py: 3 }}>
            The job is {stateWords[job.state]}. It waits for: {job.waitsFor}.
          </Typography>
        )}
      </Section>
    </>
  )
}

function MailOfJob({ jobId }: { jobId: string }) {
  const query = useQuery(mailQuery(jobId))
  return (
    <Section title="Mail of this job">
      <QueryGate query={query}>{(mail) => <MailList jobId={jobId} mail={mail} />}</QueryGate>
    </Section>
  )
}
