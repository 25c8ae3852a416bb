import type { SettingView, SettingsView } from 'shared'

export interface SettingGroup {
  title: string
  why: string
  settings: SettingView[]
}

/** What a design waits for stands first, then what it rests on, then what only switches a check on. */
export function settingGroups({ settings }: SettingsView): SettingGroup[] {
  const needed = settings.filter(({ isNeeded }) => isNeeded)
  const groups = [
    {
      title: 'Needed and still empty',
      why: 'No design can be worked out and no packet made before these are filled.',
      settings: needed.filter(({ value }) => value === null),
    },
    {
      title: 'Needed by every design',
      why: 'No publication gives these figures; every design of the district rests on them.',
      settings: needed.filter(({ value }) => value !== null),
    },
    {
      title: 'For single checks and figures',
      why: 'A check whose limit is empty does not apply, and says so.',
      settings: settings.filter(({ isNeeded }) => !isNeeded),
    },
  ]
  return groups.filter((group) => group.settings.length > 0)
}
