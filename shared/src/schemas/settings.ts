import { z } from 'zod'
import { civilDateSchema, lineOfText, numberBetween } from './primitives.js'

/** One engineering setting of a district. An empty value means: not entered yet. */
export const settingValueSchema = z.strictObject({
  key: lineOfText(60),
  value: numberBetween(-1e9, 1e9, '').nullable(),
  source: lineOfText(200),
  sourceDate: civilDateSchema,
})

export const settingsInputSchema = z.strictObject({
  settings: z.array(settingValueSchema).min(1).max(100),
})

export type SettingValue = z.infer<typeof settingValueSchema>

export interface SettingView extends SettingValue {
  label: string
  unit: string
  minimum: number
  maximum: number
  isNeeded: boolean
  hint: string
}

export interface SettingsView {
  version: number
  settings: SettingView[]
}
