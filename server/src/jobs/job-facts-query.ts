import type { DesignResult } from 'shared'

export interface JobFactsRow {
  designerId: string | null
  designerIds: string[]
  payeeIds: string[]
  signerIds: string[]
  everySignerReachable: boolean
  packetAId: string | null
  packetASha256: string | null
  checkerId: string | null
  withinLimits: boolean | null
  checks: DesignResult['checks'] | null
  varied: string[]
  openNotes: number
  signedByIds: string[]
  consentedIds: string[]
  hasReadIds: string[]
  packetBId: string | null
  packetBSha256: string | null
  checkerMayApprove: boolean
}

/**
 * One job in one round trip: $1 district, $2 job. A producer without a person still counts as a signer under the
 * producer's own id, which nobody can sign as: such a job waits for paper instead of passing unsigned.
 */
export const jobFactsQuery = `
  with people_of_job as (
    select p.id as producer_id, p.person_id, jp.is_signer, (p.email is not null or p.address is not null) as reachable
    from job_producers jp
    join producers p on p.district_id = jp.district_id and p.id = jp.producer_id
    where jp.district_id = $1 and jp.job_id = $2
  )
  select
    d.designer_id as "designerId",
    array(
      select distinct e.actor_id from events e
      where e.district_id = $1 and e.stream_id = $2 and e.kind in ('design-created', 'design-saved')
        and e.facts ->> 'designId' = j.chosen_design_id::text and e.actor_id is not null
    ) as "designerIds",
    array(select person_id from people_of_job where person_id is not null) as "payeeIds",
    array(select coalesce(person_id, producer_id) from people_of_job where is_signer) as "signerIds",
    coalesce((select bool_and(reachable) from people_of_job where is_signer), false) as "everySignerReachable",
    a.id as "packetAId",
    a.sha256 as "packetASha256",
    c.checker_id as "checkerId",
    c.within_limits as "withinLimits",
    d.result -> 'checks' as checks,
    array(
      select v.criterion_id from variances v where v.district_id = $1 and v.design_id = j.chosen_design_id
    ) as varied,
    (
      select count(*)::int from notes n where n.district_id = $1 and n.job_id = $2 and n.status <> 'settled'
    ) as "openNotes",
    array(
      select s.person_id from signatures s
      where s.district_id = $1 and s.packet_id = j.packet_id and s.void_at is null
    ) as "signedByIds",
    array(
      select distinct k.person_id from consents k
      join people_of_job o on o.person_id = k.person_id
      where k.district_id = $1 and k.withdrawn_at is null
    ) as "consentedIds",
    array(
      select r.person_id from page_readings r
      where r.district_id = $1 and r.packet_id = j.packet_id
      group by r.person_id
      having count(*) >= jsonb_array_length(a.pages)
    ) as "hasReadIds",
    b.id as "packetBId",
    b.sha256 as "packetBSha256",
    t.checker_may_approve as "checkerMayApprove"
  from jobs j
  join districts t on t.id = j.district_id
  left join designs d on d.district_id = j.district_id and d.id = j.chosen_design_id
  left join packets a on a.district_id = j.district_id and a.id = j.packet_id
  left join packets b on b.district_id = j.district_id and b.id = j.final_packet_id
  left join technical_checks c on c.district_id = j.district_id and c.packet_id = j.packet_id
  where j.district_id = $1 and j.id = $2
`
