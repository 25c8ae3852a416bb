import { useQuery } from '@tanstack/react-query'
import type { PacketView } from 'shared'
import { peopleQuery } from '../../api/people'
import { useMay, useSession } from '../../api/session-context'
import { ActButton } from '../../components/feedback/act-button'
import { Section } from '../../components/layout/section'
import { CheckRecord } from './check-record'
import { checkersOf } from './checkers'
import { TechnicalCheckForm } from './technical-check-form'
import { WhoMayCheck } from './who-may-check'

interface TechnicalCheckProps {
  packet: PacketView
  designerName: string | null
  /** Why a check cannot be recorded now; null when nothing is in the way. */
  lock: string | null
}

/** Figures and criteria looked at by a second person, before a packet goes out. */
export function TechnicalCheck({ packet, designerName, lock }: TechnicalCheckProps) {
  const may = useMay()
  const { personId } = useSession()
  const mayCheck = may('packet:check')
  const people = useQuery({ ...peopleQuery, enabled: may('people:read') })
  const { technicalCheck: check, revision } = packet
  const isCovered = check !== null && check.withinLimits
  const checkers = checkersOf(people.data ?? [], designerName)
  const isMine = checkers.some(({ id, isDesigner }) => isDesigner && id === personId)
  const reasons = [lock, isMine ? 'You made this design. Another person must check it.' : null].filter(
    (reason) => reason !== null,
  )
  return (
    <Section title="Technical check" aside={`revision ${revision}`}>
      <CheckRecord check={check} />
      {!isCovered && (
        <>
          {people.data && <WhoMayCheck checkers={checkers} />}
          {mayCheck && reasons.length > 0 && (
            <ActButton words="Record my check" reasons={reasons} onAct={() => undefined} />
          )}
          {mayCheck && reasons.length === 0 && (
            <TechnicalCheckForm packetId={packet.id} revision={revision} />
          )}
        </>
      )}
    </Section>
  )
}
