import { Injectable } from '@nestjs/common'
import { settingsCatalogue } from 'shared'
import { CostList } from '../districts/cost-list.entity.js'
import { CriteriaSet } from '../districts/criteria-set.entity.js'
import { DistrictSetting } from '../districts/district-setting.entity.js'
import { District } from '../districts/district.entity.js'
import { civilDateIn } from '../platform/clock/civil-date.js'
import type { Tx } from '../platform/database/tx.js'
import { ScheduleViewsService } from '../schedules/schedule-views.service.js'
import type { RulesInForce, SettingInForce } from './rules-in-force.js'

/** Reads what holds in a district today: its own day, wherever the server stands. */
@Injectable()
export class RulesInForceService {
  constructor(private readonly schedules: ScheduleViewsService) {}

  async read(tx: Tx, scheduleKeys: readonly string[]): Promise<RulesInForce> {
    const { timeZone } = await tx.manager.findOneByOrFail(District, { id: tx.districtId })
    const onDate = civilDateIn(timeZone, tx.at)
    const inForce = { districtId: tx.districtId, status: 'in-force' as const }
    return {
      onDate,
      criteriaSet: await tx.manager.findOneBy(CriteriaSet, inForce),
      costList: await tx.manager.findOneBy(CostList, inForce),
      schedules: await this.schedules.inForceOn(tx, scheduleKeys, onDate),
      settings: await this.settings(tx),
    }
  }

  /** Every setting of the catalogue, entered or not. */
  private async settings(tx: Tx): Promise<SettingInForce[]> {
    const entered = await tx.manager.findBy(DistrictSetting, { districtId: tx.districtId })
    const byKey = new Map(entered.map((setting) => [setting.key, setting]))
    return settingsCatalogue.map(({ key, label, isNeeded }) => {
      const setting = byKey.get(key)
      return {
        key,
        label,
        isNeeded,
        value: setting?.value ?? null,
        source: setting?.source ?? '',
        sourceDate: setting?.sourceDate ?? '',
      }
    })
  }
}
