import type { JobListItem, JobState } from 'shared'
import { likePattern, searchWords } from './search-text.js'

export interface ListPosition {
  updatedAt: string
  id: string
}

export interface JobListRow extends Omit<JobListItem, 'waitsFor' | 'updatedAt'> {
  state: JobState
  updatedAt: Date
}

export interface JobListFilter {
  districtId: string
  state: JobState | undefined
  find: string | undefined
  after: ListPosition | null
  limit: number
}

/**
 * One page of jobs, newest change first. It walks an index from the last row of the page before, so page N costs what
 * page 1 costs; one row more than asked for says whether there is a next page.
 */
export function jobListQuery(filter: JobListFilter): { text: string; values: unknown[] } {
  const values: unknown[] = [filter.districtId]
  const put = (value: unknown): string => `$${values.push(value)}`
  const words = searchWords(filter.find ?? '')
  const where = [
    'j.district_id = $1',
    ...(filter.state === undefined ? [] : [`j.state = ${put(filter.state)}`]),
    ...(words === '' ? [] : [`j.search_text like ${put(likePattern(words))}`]),
    ...(filter.after === null
      ? []
      : [`(j.updated_at, j.id) < (${put(filter.after.updatedAt)}, ${put(filter.after.id)})`]),
  ]
  const text = `
    select j.id, j.number, j.title, j.body, j.state, j.updated_at as "updatedAt",
      j.grade_run_per_rise as "gradeRunPerRise", j.stone_order_tons as "stoneOrderTons",
      j.landowner_share as "landownerShare",
      array(
        select p.name from job_producers jp
        join producers p on p.district_id = jp.district_id and p.id = jp.producer_id
        where jp.district_id = j.district_id and jp.job_id = j.id order by jp.position
      ) as "producerNames"
    from jobs j
    where ${where.join(' and ')}
    order by j.updated_at desc, j.id desc
    limit ${put(filter.limit + 1)}`
  return { text, values }
}
