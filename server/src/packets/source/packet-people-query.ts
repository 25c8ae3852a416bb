import type { ProducerInput } from 'shared'
import type { PacketVariance } from '../document/packet-source.js'

export interface PacketPeopleRow {
  designerName: string
  producers: { name: string; farmName: string; address: ProducerInput['address'] | null }[]
  variances: PacketVariance[]
}

/** The names a packet prints: $1 district, $2 revision. */
export const packetPeopleQuery = `
  select
    o.name as "designerName",
    coalesce((
      select jsonb_agg(
        jsonb_build_object('name', p.name, 'farmName', p.farm_name, 'address', p.address) order by jp.position
      )
      from job_producers jp
      join producers p on p.district_id = jp.district_id and p.id = jp.producer_id
      where jp.district_id = r.district_id and jp.job_id = r.job_id
    ), '[]') as producers,
    coalesce((
      select jsonb_agg(
        jsonb_build_object(
          'checkId', v.criterion_id,
          'reason', v.reason,
          'by', d.name,
          'at', to_char(v.decided_at, 'YYYY-MM-DD"T"HH24:MI:SS.MS"Z"')
        ) order by v.criterion_id
      )
      from variances v join people d on d.id = v.decided_by
      where v.district_id = r.district_id and v.design_id = r.design_id and v.decided_at <= r.made_at
    ), '[]') as variances
  from revisions r
  join people o on o.id = r.designer_id
  where r.district_id = $1 and r.id = $2
`
