import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import type { JobView } from 'shared'
import { useMakePacket } from '../../api/packets'
import { ActButton } from '../../components/feedback/act-button'
import { ProblemAlert } from '../../components/feedback/problem-alert'

interface MakePacketProps {
  job: Pick<JobView, 'id' | 'chosenDesignId' | 'revisions'>
  /** Why nobody may make one now; null when nothing is in the way. */
  lock: string | null
  /** Nothing else is to be done first. */
  isMain: boolean
}

/** Freezes the chosen design as the next revision and makes its packet, once however often it is pressed. */
export function MakePacket({ job, lock, isMain }: MakePacketProps) {
  const make = useMakePacket(job.id)
  const { chosenDesignId, revisions } = job
  const next = Math.max(0, ...revisions.map(({ number }) => number)) + 1
  const reasons = [lock, chosenDesignId === null ? 'Choose a design first.' : null].filter(
    (reason) => reason !== null,
  )
  return (
    <Box sx={{ my: 4 }}>
      <ProblemAlert error={make.error} />
      <ActButton
        words={next === 1 ? 'Make the packet' : `Make the packet as revision ${next}`}
        reasons={reasons}
        isBusy={make.isPending}
        isMain={isMain}
        onAct={() => chosenDesignId !== null && make.mutate(chosenDesignId)}
      />
      {reasons.length === 0 && (
        <Typography variant="body2" sx={{ color: 'text.secondary', mt: 2 }}>
          The design is frozen as revision {next}.
          {next > 1 && ' Earlier revisions stay readable; their signatures become void.'}
        </Typography>
      )}
    </Box>
  )
}
