import { trimmedNumber, type SettingsView, type SettingValue } from 'shared'
import type { Difference } from '../../components/feedback/stale-choice'

const MOST_PLACES = 4

const saidOf = ({ value, source, sourceDate }: SettingValue, unit: string): string => {
  const figure = value === null ? 'empty' : `${trimmedNumber(value, MOST_PLACES)} ${unit}`
  return [figure, source, sourceDate].filter((part) => part !== '').join(', ')
}

/** Where what was typed here and what somebody else saved are not the same. */
export function settingDifferences(mine: readonly SettingValue[], newer: SettingsView): Difference[] {
  return mine.flatMap((typed) => {
    const stored = newer.settings.find(({ key }) => key === typed.key)
    if (stored === undefined) return []
    const difference = {
      label: stored.label,
      mine: saidOf(typed, stored.unit),
      theirs: saidOf(stored, stored.unit),
    }
    return difference.mine === difference.theirs ? [] : [difference]
  })
}
