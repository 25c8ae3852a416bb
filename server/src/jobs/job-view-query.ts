import type { JobView, RevisionItem } from 'shared'

export interface JobViewRow {
  producers: JobView['producers']
  designerName: string | null
  hasSurvey: boolean
  revisions: (RevisionItem & { wasSent: boolean })[]
  myOpenNotes: number
}

/**
 * What a job's page shows beside its own row and the workflow's facts: $1 district, $2 job, $3 who reads. A person's
 * name is looked up here and nowhere stored.
 */
export const jobViewQuery = `
  select
    coalesce((
      select jsonb_agg(
        jsonb_build_object('id', p.id, 'name', p.name, 'farmName', p.farm_name) order by jp.position
      )
      from job_producers jp
      join producers p on p.district_id = jp.district_id and p.id = jp.producer_id
      where jp.district_id = $1 and jp.job_id = $2
    ), '[]') as producers,
    (
      select o.name from designs d join people o on o.id = d.designer_id
      where d.district_id = $1 and d.id = j.chosen_design_id
    ) as "designerName",
    exists (select 1 from surveys s where s.district_id = $1 and s.job_id = $2) as "hasSurvey",
    coalesce((
      select jsonb_agg(
        jsonb_build_object(
          'number', r.number,
          'packetId', a.id,
          'madeAt', to_char(r.made_at, 'YYYY-MM-DD"T"HH24:MI:SS.MS"Z"'),
          'sha256', a.sha256,
          'wasSent', exists (
            select 1 from events e
            where e.district_id = $1 and e.stream_id = $2 and e.kind = 'send-to-landowner'
              and e.facts ->> 'packetId' = a.id::text
          ),
          'signatures', coalesce((
            select jsonb_agg(
              jsonb_build_object(
                'name', g.typed_name,
                'signedAt', to_char(g.signed_at, 'YYYY-MM-DD"T"HH24:MI:SS.MS"Z"'),
                'isVoid', g.void_at is not null
              ) order by g.signed_at
            )
            from signatures g where g.district_id = $1 and g.packet_id = a.id
          ), '[]')
        ) order by r.number
      )
      from revisions r
      join packets a on a.district_id = r.district_id and a.revision_id = r.id and a.kind = 'A'
      where r.district_id = $1 and r.job_id = $2
    ), '[]') as revisions,
    (
      select count(*)::int from notes n
      where n.district_id = $1 and n.job_id = $2 and n.author_id = $3 and n.status <> 'settled'
    ) as "myOpenNotes"
  from jobs j
  where j.district_id = $1 and j.id = $2
`
