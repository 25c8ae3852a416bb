import { Injectable } from '@nestjs/common'
import type { JobList, JobListItem, JobListQuery } from 'shared'
import type { Tx } from '../platform/database/tx.js'
import { jobListQuery, type JobListRow } from './job-list-query.js'
import { ListCursor } from './list-cursor.js'
import { waitsFor } from './waits-for.js'

const usualPage = 50

/** The table of all jobs of a district. */
@Injectable()
export class JobListService {
  constructor(private readonly cursor: ListCursor) {}

  async list(tx: Tx, { state, find, cursor, limit = usualPage }: JobListQuery): Promise<JobList> {
    const after = cursor === undefined ? null : this.cursor.read(cursor)
    const { text, values } = jobListQuery({ districtId: tx.districtId, state, find, after, limit })
    const rows: JobListRow[] = await tx.manager.query(text, values)
    const page = rows.slice(0, limit)
    const last = page.at(-1)
    const isMore = rows.length > limit && last !== undefined
    return {
      jobs: page.map(listItem),
      nextCursor: isMore ? this.cursor.write({ updatedAt: last.updatedAt.toISOString(), id: last.id }) : null,
    }
  }
}

const listItem = (row: JobListRow): JobListItem => ({
  ...row,
  waitsFor: waitsFor[row.state],
  updatedAt: row.updatedAt.toISOString(),
})
