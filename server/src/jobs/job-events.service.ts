import { Injectable } from '@nestjs/common'
import { reachOf, type EventView } from 'shared'
import type { Tx } from '../platform/database/tx.js'
import type { EventFacts } from '../platform/events/event-facts.js'
import { eventSentence, landownerSees } from './event-sentences.js'
import { JobAccessService, type Asking } from './job-access.service.js'

interface EventLine {
  sequence: number
  kind: string
  at: Date
  who: string | null
  design: string | null
  facts: EventFacts
  rowHash: string
}

/** Names are looked up now: a person who changed the name is called by the new one, and the chain still holds. */
const eventsQuery = `
  select e.sequence, e.kind, e.at, e.facts, e.row_hash as "rowHash", o.name as who, d.name as design
  from events e
  left join people o on o.id = e.actor_id
  left join designs d on d.district_id = e.district_id and d.id::text = e.facts ->> 'designId'
  where e.district_id = $1 and e.stream_id = $2
  order by e.sequence
`

/** The timeline of a job in plain sentences, oldest first. */
@Injectable()
export class JobEventsService {
  constructor(private readonly jobs: JobAccessService) {}

  async list(tx: Tx, asking: Asking, jobId: string): Promise<EventView[]> {
    await this.jobs.find(tx, asking, 'job:read', jobId, 'to-read')
    const lines: EventLine[] = await tx.manager.query(eventsQuery, [tx.districtId, jobId])
    const seesAll = reachOf(asking.actor, 'job:read') === 'district'
    return lines.filter(({ kind }) => seesAll || landownerSees(kind)).map(eventView)
  }
}

function eventView({ sequence, kind, at, who, design, facts, rowHash }: EventLine): EventView {
  const words = { who: who ?? 'Wadestone', design: design ?? 'a design', facts }
  return { sequence, kind, at: at.toISOString(), who, sentence: eventSentence(kind, words), rowHash }
}
