import { useQuery } from '@tanstack/react-query'
import { useEffect, useRef } from 'react'
import type { PacketView } from 'shared'
import { useJobRefresh } from '../../api/jobs'
import { packetQuery } from '../../api/packets'

export const isUnderWay = ({ status }: Pick<PacketView, 'status'>): boolean =>
  status === 'waiting' || status === 'making'

/**
 * A packet, asked for again while it is being made. What a job allows follows from its packet, so the job is read again
 * once the packet is done: also when it was done before this page opened and the job in hand is older than that.
 */
export function usePacket(packetId: string, isJobBehind: boolean) {
  const query = useQuery(packetQuery(packetId))
  const refresh = useJobRefresh()
  const told = useRef<string | null>(null)
  const packet = query.data
  useEffect(() => {
    if (packet === undefined) return
    if (isUnderWay(packet)) {
      told.current = null
      return
    }
    if (!isJobBehind || told.current === packet.id) return
    told.current = packet.id
    void refresh(packet.jobId)
  }, [packet, isJobBehind, refresh])
  return query
}
