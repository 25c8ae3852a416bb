import { numberBetween, settingValueSchema, type SettingsView, type SettingView } from 'shared'
import { z } from 'zod'

/** What stands in the boxes of one setting. */
export interface SettingEntry {
  /** Null when it was emptied. */
  value?: number | null
  source: string
  sourceDate: string
}

export interface SettingsFields {
  entries: Record<string, SettingEntry>
}

export const fieldsOf = ({ settings }: SettingsView): SettingsFields => ({
  entries: Object.fromEntries(
    settings.map(({ key, value, source, sourceDate }) => [
      key,
      { value: value ?? undefined, source, sourceDate },
    ]),
  ),
})

const isBlank = ({ value, source, sourceDate }: SettingEntry): boolean =>
  (value ?? null) === null && source === '' && sourceDate === ''

/** A setting with a value needs its source and date; one never touched needs nothing. */
const entrySchema = ({ key, minimum, maximum, unit }: SettingView) =>
  z
    .strictObject({
      value: numberBetween(minimum, maximum, unit).nullish(),
      source: z.string(),
      sourceDate: z.string(),
    })
    .superRefine((entry, context) => {
      if (isBlank(entry)) return
      const read = settingValueSchema.safeParse({ ...entry, key, value: entry.value ?? null })
      for (const { path, message } of read.error?.issues ?? [])
        context.addIssue({ code: 'custom', path, message })
    })

export const settingsSchema = ({ settings }: SettingsView) =>
  z.strictObject({
    entries: z.strictObject(
      Object.fromEntries(settings.map((setting) => [setting.key, entrySchema(setting)])),
    ),
  }) as unknown as z.ZodType<SettingsFields, SettingsFields>
