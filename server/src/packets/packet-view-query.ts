import type { PacketView } from 'shared'

export interface PacketViewRow {
  revision: number
  pagesReadByMe: number[]
  iHaveConsented: boolean
  technicalCheck: PacketView['technicalCheck']
  signatures: PacketView['signatures']
}

const instant = (column: string): string => `to_char(${column}, 'YYYY-MM-DD"T"HH24:MI:SS.MS"Z"')`

/** What is shown of a packet beside its own row: $1 district, $2 packet, $3 who reads. */
export const packetViewQuery = `
  select
    r.number as revision,
    array(
      select g.page from page_readings g
      where g.district_id = $1 and g.packet_id = $2 and g.person_id = $3 order by g.page
    ) as "pagesReadByMe",
    exists (
      select 1 from consents k where k.district_id = $1 and k.person_id = $3 and k.withdrawn_at is null
    ) as "iHaveConsented",
    (
      select jsonb_build_object(
        'by', o.name, 'at', ${instant('c.checked_at')}, 'note', c.note, 'withinLimits', c.within_limits
      )
      from technical_checks c join people o on o.id = c.checker_id
      where c.district_id = $1 and c.packet_id = $2
    ) as "technicalCheck",
    coalesce((
      select jsonb_agg(
        jsonb_build_object(
          'name', s.typed_name, 'signedAt', ${instant('s.signed_at')}, 'isVoid', s.void_at is not null
        ) order by s.signed_at
      )
      from signatures s
      join packets q on q.district_id = s.district_id and q.id = s.packet_id
      where s.district_id = $1 and q.revision_id = p.revision_id
    ), '[]') as signatures
  from packets p
  join revisions r on r.district_id = p.district_id and r.id = p.revision_id
  where p.district_id = $1 and p.id = $2
`
