import { settingsCatalogue, type SettingsView, type SettingValue } from 'shared'

/** Every setting there is, in the order of the catalogue; one never entered is empty, and not left out. */
export function settingsView(version: number, entered: readonly SettingValue[]): SettingsView {
  const byKey = new Map(entered.map((setting) => [setting.key, setting]))
  return {
    version,
    settings: settingsCatalogue.map(({ key, label, unit, minimum, maximum, isNeeded, hint }) => {
      const { value = null, source = '', sourceDate = '' } = byKey.get(key) ?? {}
      return { key, value, source, sourceDate, label, unit, minimum, maximum, isNeeded, hint }
    }),
  }
}
