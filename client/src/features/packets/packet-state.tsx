import Box from '@mui/material/Box'
import LinearProgress from '@mui/material/LinearProgress'
import Typography from '@mui/material/Typography'
import type { ReactNode } from 'react'
import type { PacketView } from 'shared'
import { useMakePacketAgain } from '../../api/packets'
import { useMay } from '../../api/session-context'
import { ActButton } from '../../components/feedback/act-button'
import { ProblemAlert } from '../../components/feedback/problem-alert'
import { QueryGate } from '../../components/feedback/query-gate'
import { VerdictMark } from '../../components/feedback/verdict-mark'
import { usePacket } from './use-packet'

const progressWords = {
  waiting: 'It waits for its turn.',
  making: 'Drawings and pages are being made.',
} as const

interface PacketStateProps {
  packetId: string
  /** The job in hand does not know yet that this packet is made. */
  isJobBehind: boolean
  /** Shown once it is made. */
  children: (packet: PacketView) => ReactNode
}

/** A packet while it is made, when that failed, and when it is there. */
export function PacketState({ packetId, isJobBehind, children }: PacketStateProps) {
  const query = usePacket(packetId, isJobBehind)
  return (
    <QueryGate query={query} lines={4}>
      {(packet) => {
        if (packet.status === 'ready') return children(packet)
        if (packet.status === 'failed') return <Failure packet={packet} />
        return <Progress revision={packet.revision} words={progressWords[packet.status]} />
      }}
    </QueryGate>
  )
}

function Progress({ revision, words }: { revision: number; words: string }) {
  const label = `The packet of revision ${revision} is being made`
  return (
    <Box role="status" sx={{ maxWidth: 560, my: 4 }}>
      <Typography sx={{ fontWeight: 600, mb: 2 }}>{label}.</Typography>
      <LinearProgress aria-label={label} />
      <Typography variant="body2" sx={{ color: 'text.secondary', mt: 2 }}>
        {words} You may leave this page; it will be here when you come back.
      </Typography>
    </Box>
  )
}

function Failure({ packet }: { packet: PacketView }) {
  const again = useMakePacketAgain(packet.id)
  const may = useMay()
  return (
    <Box role="alert" sx={{ my: 4, maxWidth: 560 }}>
      <VerdictMark kind="fail" words="not made" />
      <Typography>
        The packet of revision {packet.revision} could not be made. If it fails once more, tell an
        administrator the number of this job.
      </Typography>
      {may('packet:make-again') && (
        <Box sx={{ mt: 3 }}>
          <ProblemAlert error={again.error} />
          <ActButton
            words="Make it again"
            busyWords="Asking…"
            isBusy={again.isPending}
            onAct={() => again.mutate()}
          />
        </Box>
      )}
    </Box>
  )
}
