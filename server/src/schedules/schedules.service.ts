import { randomUUID } from 'node:crypto'
import { Injectable } from '@nestjs/common'
import { Problem, type ScheduleInput, type ScheduleLine, type ScheduleView } from 'shared'
import { InForceService } from '../districts/in-force.service.js'
import type { Tx } from '../platform/database/tx.js'
import { EventLog } from '../platform/events/event-log.service.js'
import { PaymentSchedule } from './payment-schedule.entity.js'
import { remappingProblems } from './remapping-problems.js'
import { ScheduleLineRow } from './schedule-line.entity.js'
import { scheduleProblems } from './schedule-problems.js'
import { lineRows, termColumns } from './schedule-rows.js'
import { ScheduleViewsService } from './schedule-views.service.js'

const noun = 'payment schedule'

export interface SeenSchedule {
  id: string
  version: number
}

/** What the funding sources of a district pay, written while a schedule is a draft. */
@Injectable()
export class SchedulesService {
  constructor(
    private readonly views: ScheduleViewsService,
    private readonly inForce: InForceService,
    private readonly events: EventLog,
  ) {}

  async create(tx: Tx, input: ScheduleInput): Promise<ScheduleView> {
    refuse(scheduleProblems(input))
    const schedule = tx.manager.create(PaymentSchedule, {
      ...termColumns(input),
      districtId: tx.districtId,
      id: randomUUID(),
      status: 'draft',
      version: 1,
      createdAt: tx.at,
    })
    await tx.manager.insert(PaymentSchedule, schedule)
    return this.written(tx, schedule, 'schedule-made', input)
  }

  /** @throws Problem invalid-fields, already-in-use, or stale-version with the newer schedule. */
  async update(tx: Tx, seen: SeenSchedule, input: ScheduleInput): Promise<ScheduleView> {
    refuse(scheduleProblems(input))
    const schedule = await this.holdDraft(tx, seen)
    await this.moveOn(tx, schedule, termColumns(input))
    await tx.manager.delete(ScheduleLineRow, { districtId: tx.districtId, scheduleId: schedule.id })
    return this.written(tx, schedule, 'schedule-saved', input)
  }

  /** Maps the lines named; the others stay mapped as they are. */
  async map(
    tx: Tx,
    seen: SeenSchedule,
    mapping: readonly Pick<ScheduleLine, 'code' | 'quantityKey'>[],
  ): Promise<ScheduleView> {
    const schedule = await this.holdDraft(tx, seen)
    refuse(remappingProblems(await this.views.linesOf(tx, schedule.id), mapping))
    await tx.manager.query(
      `update schedule_lines l set quantity_key = m.quantity_key
       from unnest($3::text[], $4::text[]) as m (code, quantity_key)
       where l.district_id = $1 and l.schedule_id = $2 and l.code = m.code`,
      [
        tx.districtId,
        schedule.id,
        mapping.map(({ code }) => code),
        mapping.map(({ quantityKey }) => quantityKey),
      ],
    )
    await this.moveOn(tx, schedule, {})
    return this.told(tx, schedule, 'schedule-mapped')
  }

  /** @throws Problem not-found, already-in-use, schedule-not-mapped, or invalid-fields outside its days. */
  async putInForce(tx: Tx, id: string): Promise<ScheduleView> {
    const retiredId = await this.inForce.put(tx, { entity: PaymentSchedule, noun, id })
    const schedule = await this.views.load(tx, id, 'to-read')
    await this.requireMapped(tx, schedule)
    return this.told(tx, schedule, 'schedule-in-force', { retiredId })
  }

  /** A draft as the caller saw it, held until the transaction ends. */
  private async holdDraft(tx: Tx, { id, version }: SeenSchedule): Promise<PaymentSchedule> {
    const schedule = await this.views.load(tx, id, 'to-change')
    this.inForce.requireDraft(schedule, noun)
    if (schedule.version === version) return schedule
    const detail = `Somebody saved version ${schedule.version} of ${schedule.name} in between.`
    throw new Problem('stale-version', { detail, current: await this.views.viewOf(tx, schedule) })
  }

  private async moveOn(tx: Tx, schedule: PaymentSchedule, change: Partial<PaymentSchedule>): Promise<void> {
    const saved = { ...change, version: schedule.version + 1 }
    await tx.manager.update(PaymentSchedule, { districtId: tx.districtId, id: schedule.id }, saved)
    Object.assign(schedule, saved)
  }

  /** One that pays by the unit and is mapped to nothing would silently pay nothing. */
  private async requireMapped(tx: Tx, { id, name, kind }: PaymentSchedule): Promise<void> {
    if (kind !== 'unit-rate') return
    const lines = await this.views.linesOf(tx, id)
    if (lines.some(({ quantityKey }) => quantityKey !== null)) return
    const message = `No line of ${name} is mapped to a quantity, so it would pay nothing. Map those that a ramp needs.`
    throw new Problem('schedule-not-mapped', {
      detail: message,
      fields: [{ pointer: '/lines', message }],
    })
  }

  private async written(
    tx: Tx,
    schedule: PaymentSchedule,
    kind: 'schedule-made' | 'schedule-saved',
    input: ScheduleInput,
  ): Promise<ScheduleView> {
    if (input.lines.length > 0) await tx.manager.insert(ScheduleLineRow, lineRows(schedule, input))
    return this.told(tx, schedule, kind)
  }

  private async told(
    tx: Tx,
    { id, version }: PaymentSchedule,
    kind: string,
    facts: { retiredId?: string | null } = {},
  ): Promise<ScheduleView> {
    await this.events.append(tx, {
      streamId: tx.districtId,
      kind,
      facts: { scheduleId: id, version, ...facts },
    })
    return this.views.read(tx, id)
  }
}

function refuse(fields: ReturnType<typeof scheduleProblems>): void {
  if (fields.length > 0) throw new Problem('invalid-fields', { fields })
}
