import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query'
import type { PacketView } from 'shared'
import { useJobRefresh } from './jobs'
import { request } from './request'
import { useIntention } from './use-intention'

const packetKey = (id: string) => ['packets', id] as const
const isUnderWay = (packet: PacketView | undefined): boolean =>
  packet?.status === 'waiting' || packet?.status === 'making'

/** Asks again every second while the packet is being made. */
export const packetQuery = (id: string) =>
  queryOptions({
    queryKey: packetKey(id),
    queryFn: ({ signal }) => request<PacketView>(`/packets/${id}`, { signal }),
    refetchInterval: (query) => (isUnderWay(query.state.data) ? 1000 : false),
  })

export const packetFileUrl = (id: string) => `/api/packets/${id}/file`

function useStorePacket() {
  const queries = useQueryClient()
  const refresh = useJobRefresh()
  return async (packet: PacketView) => {
    queries.setQueryData(packetKey(packet.id), packet)
    await refresh(packet.jobId)
  }
}

export function useMakePacket(jobId: string) {
  const intention = useIntention()
  const onSuccess = useStorePacket()
  return useMutation({
    mutationFn: (designId: string) =>
      intention.run({ designId }, (idempotencyKey) =>
        request<PacketView>(`/jobs/${jobId}/packets`, { method: 'POST', body: { designId }, idempotencyKey }),
      ),
    onSuccess,
  })
}

/** A packet that could not be made, once more. */
export function useMakePacketAgain(packetId: string) {
  const intention = useIntention()
  const onSuccess = useStorePacket()
  return useMutation({
    mutationFn: () =>
      intention.run({ packetId }, (idempotencyKey) =>
        request<PacketView>(`/packets/${packetId}/make-again`, { method: 'POST', body: {}, idempotencyKey }),
      ),
    onSuccess,
  })
}

export function useTechnicalCheck(packetId: string) {
  const intention = useIntention()
  const onSuccess = useStorePacket()
  return useMutation({
    mutationFn: (body: { note?: string }) =>
      intention.run(body, (idempotencyKey) =>
        request<PacketView>(`/packets/${packetId}/technical-check`, { method: 'POST', body, idempotencyKey }),
      ),
    onSuccess,
  })
}

export function useConsent(packetId: string) {
  const onSuccess = useStorePacket()
  return useMutation({
    mutationFn: () =>
      request<PacketView>(`/packets/${packetId}/consent`, {
        method: 'POST',
        body: { consentVersion: '2026-1', agrees: true },
      }),
    onSuccess,
  })
}

const unionOf = (one: readonly number[], other: readonly number[]): number[] => [
  ...new Set([...one, ...other]),
]

export function useReadPage(packetId: string) {
  const queries = useQueryClient()
  const refresh = useJobRefresh()
  return useMutation({
    mutationFn: (page: number) =>
      request<PacketView>(`/packets/${packetId}/read-pages`, { method: 'POST', body: { page } }),
    onSuccess: async (packet) => {
      // An answer still under way may be older than this one, and a page once read stays read.
      await queries.cancelQueries({ queryKey: packetKey(packet.id) })
      queries.setQueryData<PacketView>(packetKey(packet.id), (earlier) => ({
        ...packet,
        pagesReadByMe: unionOf(earlier?.pagesReadByMe ?? [], packet.pagesReadByMe),
      }))
      await refresh(packet.jobId)
    },
  })
}
