import { Injectable } from '@nestjs/common'
import { Problem, type SettingsView, type SettingValue } from 'shared'
import type { Tx } from '../platform/database/tx.js'
import { EventLog } from '../platform/events/event-log.service.js'
import { DistrictSetting } from './district-setting.entity.js'
import { District } from './district.entity.js'
import { settingProblems } from './setting-problems.js'
import { settingsView } from './settings-view.js'

/** The engineering figures a district enters for itself. They carry one version together. */
@Injectable()
export class SettingsService {
  constructor(private readonly events: EventLog) {}

  async read(tx: Tx): Promise<SettingsView> {
    const { settingsVersion } = await tx.manager.findOneByOrFail(District, { id: tx.districtId })
    return this.viewOf(tx, settingsVersion)
  }

  /**
   * Saves the settings given; the others stay as they are.
   *
   * @throws Problem invalid-fields, or stale-version with the settings as they are by now.
   */
  async save(tx: Tx, version: number, settings: readonly SettingValue[]): Promise<SettingsView> {
    const fields = settingProblems(settings)
    if (fields.length > 0) throw new Problem('invalid-fields', { fields })
    // Held until the transaction ends, so that of two savers one sees what the other wrote.
    const { settingsVersion } = await tx.manager.findOneOrFail(District, {
      where: { id: tx.districtId },
      lock: { mode: 'for_no_key_update' },
    })
    if (settingsVersion !== version) await this.refuseStale(tx, settingsVersion)
    await this.write(tx, settings)
    await tx.manager.update(District, { id: tx.districtId }, { settingsVersion: version + 1 })
    const facts = { version: version + 1 }
    await this.events.append(tx, { streamId: tx.districtId, kind: 'settings-saved', facts })
    return this.viewOf(tx, version + 1)
  }

  private async write(tx: Tx, settings: readonly SettingValue[]): Promise<void> {
    const { districtId, at: updatedAt } = tx
    const rows = settings.map((setting) => ({ ...setting, districtId, updatedAt }))
    await tx.manager.upsert(DistrictSetting, rows, ['districtId', 'key'])
  }

  private async viewOf(tx: Tx, version: number): Promise<SettingsView> {
    return settingsView(version, await tx.manager.findBy(DistrictSetting, { districtId: tx.districtId }))
  }

  private async refuseStale(tx: Tx, version: number): Promise<never> {
    const detail = `Somebody saved version ${version} of the settings in between.`
    throw new Problem('stale-version', { detail, current: await this.viewOf(tx, version) })
  }
}
