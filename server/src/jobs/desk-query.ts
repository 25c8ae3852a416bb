/**
 * Every job that may wait for a person: $1 district, $2 the person, $3 states that are looked at, $4 whether only the
 * person's own jobs as a producer. The rules of the desk then say which of them do, and in which words.
 */
export const deskQuery = `
  select j.id, j.number, j.title, j.state, j.state_since as "stateSince",
    (j.created_by = $2 or coalesce(d.designer_id = $2, false)) as "isMine",
    coalesce(d.designer_id = $2, false) or exists (
      select 1 from events e
      where e.district_id = $1 and e.stream_id = j.id and e.actor_id = $2
        and e.kind in ('design-created', 'design-saved') and e.facts ->> 'designId' = j.chosen_design_id::text
    ) as "isDesigner",
    o.name as "designerName",
    exists (select 1 from surveys s where s.district_id = $1 and s.job_id = j.id) as "hasSurvey",
    d.id is not null as "hasDesign",
    d.id is not null and not exists (
      select 1 from jsonb_each(d.result) part
      where jsonb_typeof(part.value) = 'object' and part.value ->> 'ok' = 'false'
    ) as "isWhole",
    coalesce(f.failing, 0)::int as "failingChecks",
    f.first as "firstFailing",
    coalesce(n.open, 0)::int as "openNotes",
    n.first as "firstNote",
    r.number as revision,
    a.status as "packetStatus",
    a.ready_at as "packetReadyAt",
    c.checked_at as "checkedAt",
    coalesce(c.within_limits, false) as "checkWithinLimits",
    exists (
      select 1 from signatures g
      where g.district_id = $1 and g.packet_id = j.packet_id and g.person_id = $2 and g.void_at is null
    ) as "hasSigned",
    b.sha256 is not null as "finalPacketReady"
  from jobs j
  left join designs d on d.district_id = $1 and d.id = j.chosen_design_id
  left join people o on o.id = d.designer_id
  left join packets a on a.district_id = $1 and a.id = j.packet_id
  left join revisions r on r.district_id = $1 and r.id = a.revision_id
  left join packets b on b.district_id = $1 and b.id = j.final_packet_id
  left join technical_checks c on c.district_id = $1 and c.packet_id = j.packet_id
  left join lateral (
    select count(*) as failing, min(k.title) as first
    from jsonb_to_recordset(d.result -> 'checks') as k(id text, title text, verdict text)
    where k.verdict = 'fail' and not exists (
      select 1 from variances v where v.district_id = $1 and v.design_id = d.id and v.criterion_id = k.id
    )
  ) f on true
  left join lateral (
    select count(*) as open, (array_agg(w.text order by w.written_at))[1] as first
    from notes w where w.district_id = $1 and w.job_id = j.id and w.status <> 'settled'
  ) n on true
  where j.district_id = $1 and j.state = any($3)
    and (not $4 or exists (
      select 1 from job_producers jp
      join producers p on p.district_id = $1 and p.id = jp.producer_id
      where jp.district_id = $1 and jp.job_id = j.id and p.person_id = $2
    ))
  order by j.state_since, j.id
  limit 1000
`
