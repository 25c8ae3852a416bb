import type { SettingsView, SettingValue } from 'shared'
import type { SettingsFields } from './settings-form-schema'

const isSame = (one: SettingValue, other: SettingValue): boolean =>
  one.value === other.value && one.source === other.source && one.sourceDate === other.sourceDate

/** What was typed other than it was seen. Only that is sent, so that nothing else is written over. */
export function changedSettings(seen: SettingsView, { entries }: Partial<SettingsFields>): SettingValue[] {
  return seen.settings.flatMap((stored) => {
    const entry = entries?.[stored.key]
    if (entry === undefined) return []
    const { source, sourceDate } = entry
    const typed = { key: stored.key, value: entry.value ?? null, source, sourceDate }
    return isSame(typed, stored) ? [] : [typed]
  })
}
