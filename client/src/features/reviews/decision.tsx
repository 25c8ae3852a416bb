import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import { stateWords, type JobView, type PacketView } from 'shared'
import { Section } from '../../components/layout/section'
import { ApproveForm } from './approve-form'
import { ReturnForm } from './return-form'

interface DecisionProps {
  job: JobView
  packet: PacketView
}

/** Approve or return, with what still blocks either. */
export function Decision({ job, packet }: DecisionProps) {
  const approve = job.actions.find(({ action }) => action === 'approve')
  const giveBack = job.actions.find(({ action }) => action === 'return')
  if (!approve && !giveBack) {
    return (
      <Section title="Decision">
        <Typography role="status" sx={{ py: 3 }}>
          Nothing waits for your decision. The job is {stateWords[job.state]}; it waits for: {job.waitsFor}.
        </Typography>
      </Section>
    )
  }
  return (
    <>
      {approve && packet.sha256 !== null && (
        <Section title={approve.words} aside={`revision ${packet.revision}`}>
          <Box sx={{ py: 3 }}>
            <ApproveForm
              key={packet.sha256}
              job={job}
              offered={approve}
              revision={packet.revision}
              packetSha256={packet.sha256}
            />
          </Box>
        </Section>
      )}
      {giveBack && (
        <Section title={giveBack.words}>
          <Box sx={{ py: 3 }}>
            <ReturnForm job={job} offered={giveBack} pages={packet.pages.length} />
          </Box>
        </Section>
      )}
    </>
  )
}
