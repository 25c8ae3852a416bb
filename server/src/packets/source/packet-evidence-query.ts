import type { PacketEvidence, PacketSignature } from '../document/packet-source.js'

export interface PacketEvidenceRow {
  signatures: PacketSignature[]
  technicalCheck: PacketEvidence['technicalCheck']
  approval: PacketEvidence['approval'] | null
}

const instant = (column: string): string => `to_char(${column}, 'YYYY-MM-DD"T"HH24:MI:SS.MS"Z"')`

/** Who signed, checked and approved packet A: $1 district, $2 packet A. Signatures that are void prove nothing. */
export const packetEvidenceQuery = `
  select
    coalesce((
      select jsonb_agg(
        jsonb_build_object(
          'name', o.name,
          'typedName', s.typed_name,
          'signedAt', ${instant('s.signed_at')},
          'method', s.method,
          'consentVersion', k.consent_version,
          'ip', s.remote_address,
          'userAgent', s.user_agent
        ) order by s.signed_at
      )
      from signatures s
      join people o on o.id = s.person_id
      join consents k on k.district_id = s.district_id and k.id = s.consent_id
      where s.district_id = $1 and s.packet_id = $2 and s.void_at is null
    ), '[]') as signatures,
    (
      select jsonb_build_object(
        'by', o.name, 'at', ${instant('c.checked_at')}, 'withinLimits', c.within_limits, 'note', c.note
      )
      from technical_checks c join people o on o.id = c.checker_id
      where c.district_id = $1 and c.packet_id = $2
    ) as "technicalCheck",
    (
      select jsonb_strip_nulls(jsonb_build_object(
        'name', o.name,
        'at', ${instant('a.approved_at')},
        'meetingDate', to_char(a.meeting_date, 'YYYY-MM-DD'),
        'agendaItem', a.agenda_item
      ))
      from approvals a join people o on o.id = a.supervisor_id
      where a.district_id = $1 and a.packet_id = $2
    ) as approval
`
