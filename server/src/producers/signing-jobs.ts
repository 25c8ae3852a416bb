import type { Tx } from '../platform/database/tx.js'

export interface OpenJob {
  jobId: string
  number: string
  state: string
  /** Another producer of the same job is this very person. */
  isPersonTwice: boolean
}

/** Jobs of a producer that are still on their way to the landowner's copy: $1 district, $2 producer, $3 person. */
const openJobsQuery = `
  select j.id as "jobId", j.number, j.state, exists (
    select 1 from job_producers o
    join producers p on p.district_id = o.district_id and p.id = o.producer_id
    where o.district_id = $1 and o.job_id = j.id and o.producer_id <> $2 and p.person_id = $3
  ) as "isPersonTwice"
  from job_producers jp
  join jobs j on j.district_id = jp.district_id and j.id = jp.job_id
  where jp.district_id = $1 and jp.producer_id = $2
    and j.state in ('draft', 'returned', 'with-landowner', 'with-supervisor', 'approved')
  order by j.number
  for update of j
`

/** Held until the transaction ends, so that nobody signs or approves while a signer's address changes. */
export function holdOpenJobs(
  { manager, districtId }: Tx,
  { producerId, personId }: { producerId: string; personId: string | null },
): Promise<OpenJob[]> {
  return manager.query(openJobsQuery, [districtId, producerId, personId])
}
