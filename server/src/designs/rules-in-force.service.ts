import { Injectable } from '@nestjs/common'
import { settingsCatalogue } from 'shared'
import { In, LessThanOrEqual, MoreThanOrEqual } from 'typeorm'
import { CostList } from '../districts/cost-list.entity.js'
import { CriteriaSet } from '../districts/criteria-set.entity.js'
import { DistrictSetting } from '../districts/district-setting.entity.js'
import { District } from '../districts/district.entity.js'
import { civilDateIn } from '../platform/clock/civil-date.js'
import type { Tx } from '../platform/database/tx.js'
import { PaymentSchedule } from '../schedules/payment-schedule.entity.js'
import { ScheduleLineRow } from '../schedules/schedule-line.entity.js'
import type { RulesInForce, SettingInForce } from './rules-in-force.js'
import { scheduleInForce, type ScheduleInForce } from './schedule-in-force.js'

/** Reads what holds in a district today: its own day, wherever the server stands. */
@Injectable()
export class RulesInForceService {
  async read(tx: Tx, scheduleKeys: readonly string[]): Promise<RulesInForce> {
    const { timeZone } = await tx.manager.findOneByOrFail(District, { id: tx.districtId })
    const onDate = civilDateIn(timeZone, tx.at)
    const inForce = { districtId: tx.districtId, status: 'in-force' as const }
    return {
      onDate,
      criteriaSet: await tx.manager.findOneBy(CriteriaSet, inForce),
      costList: await tx.manager.findOneBy(CostList, inForce),
      schedules: await this.schedules(tx, scheduleKeys, onDate),
      settings: await this.settings(tx),
    }
  }

  private async schedules(tx: Tx, keys: readonly string[], onDate: string): Promise<ScheduleInForce[]> {
    if (keys.length === 0) return []
    const { districtId } = tx
    const rows = await tx.manager.findBy(PaymentSchedule, {
      districtId,
      key: In([...keys]),
      status: 'in-force',
      effectiveFrom: LessThanOrEqual(onDate),
      effectiveTo: MoreThanOrEqual(onDate),
    })
    const lines = await tx.manager.find(ScheduleLineRow, {
      where: { districtId, scheduleId: In(rows.map(({ id }) => id)) },
      order: { position: 'ASC' },
    })
    return rows.map((row) =>
      scheduleInForce(
        row,
        lines.filter(({ scheduleId }) => scheduleId === row.id),
      ),
    )
  }

  /** Every setting of the catalogue, entered or not. */
  private async settings(tx: Tx): Promise<SettingInForce[]> {
    const entered = await tx.manager.findBy(DistrictSetting, { districtId: tx.districtId })
    const byKey = new Map(entered.map((setting) => [setting.key, setting]))
    return settingsCatalogue.map(({ key, label, isNeeded }) => {
      const setting = byKey.get(key)
      return { key, label, isNeeded, value: setting?.value ?? null, source: setting?.source ?? '' }
    })
  }
}
