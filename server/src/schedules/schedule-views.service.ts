import { Injectable } from '@nestjs/common'
import { Problem, type ScheduleListItem, type ScheduleView } from 'shared'
import { In, LessThanOrEqual, MoreThanOrEqual } from 'typeorm'
import type { Tx } from '../platform/database/tx.js'
import { PaymentSchedule } from './payment-schedule.entity.js'
import { ScheduleLineRow } from './schedule-line.entity.js'
import { scheduleView } from './schedule-view.js'

interface LineCount {
  scheduleId: string
  lines: number
  unmapped: number
}

/** Payment schedules as they are read. */
@Injectable()
export class ScheduleViewsService {
  /** By name, and of each the newest first. */
  async list(tx: Tx): Promise<ScheduleListItem[]> {
    const schedules = await tx.manager.find(PaymentSchedule, {
      where: { districtId: tx.districtId },
      order: { name: 'ASC', fiscalYear: 'DESC', createdAt: 'DESC', id: 'ASC' },
    })
    const counts = await this.lineCounts(tx)
    return schedules.map(({ id, key, name, fiscalYear, kind, status, effectiveFrom, effectiveTo }) => ({
      ...{ id, key, name, fiscalYear, kind, status, effectiveFrom, effectiveTo },
      lines: counts.get(id)?.lines ?? 0,
      unmappedLines: counts.get(id)?.unmapped ?? 0,
    }))
  }

  async read(tx: Tx, id: string): Promise<ScheduleView> {
    return this.viewOf(tx, await this.load(tx, id, 'to-read'))
  }

  async viewOf(tx: Tx, schedule: PaymentSchedule): Promise<ScheduleView> {
    return scheduleView(schedule, await this.linesOf(tx, schedule.id))
  }

  /** Those of the keys that are in force and run on a day. */
  async inForceOn(tx: Tx, keys: readonly string[], onDate: string): Promise<ScheduleView[]> {
    if (keys.length === 0) return []
    const schedules = await tx.manager.findBy(PaymentSchedule, {
      districtId: tx.districtId,
      key: In([...keys]),
      status: 'in-force',
      effectiveFrom: LessThanOrEqual(onDate),
      effectiveTo: MoreThanOrEqual(onDate),
    })
    const views: ScheduleView[] = []
    for (const schedule of schedules) views.push(await this.viewOf(tx, schedule))
    return views
  }

  /** In their printed order. */
  linesOf(tx: Tx, scheduleId: string): Promise<ScheduleLineRow[]> {
    return tx.manager.find(ScheduleLineRow, {
      where: { districtId: tx.districtId, scheduleId },
      order: { position: 'ASC' },
    })
  }

  /** @param lock `to-change` holds the row until the transaction ends, so that two savers come one by one. */
  async load(tx: Tx, id: string, lock: 'to-read' | 'to-change'): Promise<PaymentSchedule> {
    const schedule = await tx.manager.findOne(PaymentSchedule, {
      where: { districtId: tx.districtId, id },
      ...(lock === 'to-change' ? { lock: { mode: 'pessimistic_write' } } : {}),
    })
    if (schedule === null) throw new Problem('not-found')
    return schedule
  }

  private async lineCounts(tx: Tx): Promise<Map<string, LineCount>> {
    const counts: LineCount[] = await tx.manager.query(
      `select schedule_id as "scheduleId", count(*)::int as lines,
        count(*) filter (where quantity_key is null)::int as unmapped
       from schedule_lines where district_id = $1 group by schedule_id`,
      [tx.districtId],
    )
    return new Map(counts.map((count) => [count.scheduleId, count]))
  }
}
