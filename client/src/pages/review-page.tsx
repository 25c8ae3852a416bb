import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import { useQuery } from '@tanstack/react-query'
import { useParams } from 'react-router-dom'
import type { JobView, PacketView } from 'shared'
import { jobQuery } from '../api/jobs'
import { EmptyState } from '../components/feedback/empty-state'
import { QueryGate } from '../components/feedback/query-gate'
import { Page } from '../components/layout/page'
import { Section } from '../components/layout/section'
import { TextLink } from '../components/layout/text-link'
import { ChecksSummary } from '../features/checks/checks-summary'
import { ShareSummary } from '../features/cost-share/share-summary'
import { ChosenDesign } from '../features/figures/chosen-design'
import { NotReadyNote } from '../features/figures/not-ready-note'
import { CheckRecord } from '../features/packets/check-record'
import { PacketFacts } from '../features/packets/packet-facts'
import { PacketPages } from '../features/packets/packet-pages'
import { PacketState } from '../features/packets/packet-state'
import { SignatureList } from '../features/packets/signature-list'
import { Decision } from '../features/reviews/decision'

export function ReviewPage() {
  const { jobId = '' } = useParams()
  const query = useQuery(jobQuery(jobId))
  return (
    <Page title="Review" maxWidth={1280}>
      <QueryGate query={query}>
        {(job) =>
          job.packetId === null ? (
            <EmptyState title="There is no packet to review">
              The planner makes it from the chosen design. It comes to you when the landowner has signed.
            </EmptyState>
          ) : (
            <PacketState packetId={job.packetId} isJobBehind={false}>
              {(packet) => <Review job={job} packet={packet} />}
            </PacketState>
          )
        }
      </QueryGate>
    </Page>
  )
}

/** What the decision rests on at left, the decision at right; on a phone one after the other. */
function Review({ job, packet }: { job: JobView; packet: PacketView }) {
  return (
    <Box
      sx={{
        display: 'grid',
        gridTemplateColumns: { xs: 'minmax(0, 1fr)', md: 'minmax(0, 1fr) 376px' },
        columnGap: 8,
        alignItems: 'start',
      }}
    >
      <Box>
        <Section title="Packet" aside={job.designerName && `designed by ${job.designerName}`}>
          <PacketFacts packet={packet} />
        </Section>
        <Section title="Pages" aside="Each opens the PDF at that page">
          <PacketPages packet={packet} />
        </Section>
        <DesignFacts jobId={job.id} />
        <Section title="Technical check">
          <CheckRecord check={packet.technicalCheck} />
        </Section>
        <Section title="Signatures">
          <SignatureList signatures={packet.signatures} />
        </Section>
      </Box>
      <Box sx={{ position: { md: 'sticky' }, top: { md: 8 } }}>
        {job.openNotes > 0 && (
          <Typography sx={{ pt: 4 }}>
            {job.openNotes === 1 ? '1 note is' : `${job.openNotes} notes are`} not settled.{' '}
            <TextLink to={`/jobs/${job.id}/notes`}>Read the notes</TextLink>
          </Typography>
        )}
        <Decision job={job} packet={packet} />
      </Box>
    </Box>
  )
}

/** While a job is with the supervisor its design is locked, so this is what the packet shows. */
function DesignFacts({ jobId }: { jobId: string }) {
  return (
    <ChosenDesign jobId={jobId}>
      {(design) => {
        const { cost, funding, checks } = design.result
        return (
          <>
            <Section title="Checks" aside={<TextLink to={`/jobs/${jobId}/checks`}>All checks</TextLink>}>
              <ChecksSummary checks={checks} />
            </Section>
            <Section
              title="Cost and funding"
              aside={<TextLink to={`/jobs/${jobId}/cost-share`}>Line by line</TextLink>}
            >
              {cost.ok && funding.ok && <ShareSummary cost={cost.value} funding={funding.value} />}
              {!funding.ok && <NotReadyNote design={design} result={funding} />}
            </Section>
          </>
        )
      }}
    </ChosenDesign>
  )
}
