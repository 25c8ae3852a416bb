import {
  forWords,
  settingsCatalogue,
  type FieldProblem,
  type SettingDefinition,
  type SettingValue,
} from 'shared'

const known: ReadonlyMap<string, SettingDefinition> = new Map(
  settingsCatalogue.map((setting) => [setting.key, setting]),
)

/** What stands against saving these, beside the field it stands in. */
export function settingProblems(settings: readonly SettingValue[]): FieldProblem[] {
  const keys = settings.map(({ key }) => key)
  return settings.flatMap(({ key, value }, index) => {
    const pointer = `/settings/${index}`
    const setting = known.get(key)
    if (setting === undefined) {
      return [{ pointer: `${pointer}/key`, message: `There is no setting "${key}". Leave it out.` }]
    }
    if (keys.indexOf(key) !== index) {
      return [{ pointer: `${pointer}/key`, message: `"${setting.label}" is given twice. Give it once.` }]
    }
    const message = value === null ? null : outOfRange(setting, value)
    return message === null ? [] : [{ pointer: `${pointer}/value`, message }]
  })
}

function outOfRange({ label, minimum, maximum, unit }: SettingDefinition, value: number): string | null {
  if (value >= minimum && value <= maximum) return null
  return `"${label}" is ${forWords(value)}; it must be from ${minimum} to ${maximum} ${unit}.`
}
