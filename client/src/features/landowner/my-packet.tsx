import { useQuery } from '@tanstack/react-query'
import type { ReactNode } from 'react'
import { useParams } from 'react-router-dom'
import type { JobView, PacketView } from 'shared'
import { jobQuery } from '../../api/jobs'
import { packetQuery } from '../../api/packets'
import { LandownerGate } from './landowner-gate'

interface MyPacketProps {
  /** The packet is null while nothing was sent to the landowner. */
  children: (job: JobView, packet: PacketView | null) => ReactNode
}

/** The job of the address and the packet that is in force for it. */
export function MyPacket({ children }: MyPacketProps) {
  const { jobId = '' } = useParams()
  const query = useQuery(jobQuery(jobId))
  return (
    <LandownerGate query={query}>
      {(job) =>
        job.packetId === null ? (
          children(job, null)
        ) : (
          <WithPacket packetId={job.packetId}>{(packet) => children(job, packet)}</WithPacket>
        )
      }
    </LandownerGate>
  )
}

interface WithPacketProps {
  packetId: string
  children: (packet: PacketView) => ReactNode
}

function WithPacket({ packetId, children }: WithPacketProps) {
  // Pages are marked read one after the other; a page that counts them asks how many there are now.
  const query = useQuery({ ...packetQuery(packetId), refetchOnMount: 'always' })
  return <LandownerGate query={query}>{children}</LandownerGate>
}
