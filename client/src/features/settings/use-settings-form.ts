import { useMemo, useState } from 'react'
import { useWatch } from 'react-hook-form'
import type { SettingsView, SettingValue } from 'shared'
import { useSaveSettings } from '../../api/districts'
import { ProblemError } from '../../api/problem-error'
import { useFilledForm } from '../../components/fields/use-filled-form'
import { changedSettings } from './changed-settings'
import { fieldsOf, settingsSchema, type SettingsFields } from './settings-form-schema'

const newerOf = (error: Error | null): SettingsView | null =>
  error instanceof ProblemError && error.slug === 'stale-version' ? (error.current as SettingsView) : null

/** The server names a setting by its place among those sent, the form by its key. */
function byKey(error: Error | null, sent: readonly SettingValue[]): Error | null {
  if (!(error instanceof ProblemError)) return error
  const { slug, status, title, message, fields, reasons, requestId } = error
  const named = fields.map((field) => ({
    ...field,
    pointer: field.pointer.replace(/^\/settings\/(\d+)/, (all, place) => {
      const key = sent[Number(place)]?.key
      return key === undefined ? all : `/entries/${key}`
    }),
  }))
  return new ProblemError({ slug, status, title, detail: message, fields: named, reasons, requestId })
}

/** All settings in one form. When somebody else saved in between, what was typed stays until one decides. */
export function useSettingsForm(view: SettingsView) {
  const save = useSaveSettings()
  const [seen, setSeen] = useState(view)
  const schema = useMemo(() => settingsSchema(view), [view])
  const { form, fill } = useFilledForm(schema, fieldsOf(view))
  const typed = useWatch({ control: form.control }) as Partial<SettingsFields>
  const hasChanges = changedSettings(seen, typed).length > 0
  const newer = newerOf(save.error)
  const sent = save.variables?.settings

  const take = (saved: SettingsView) => {
    setSeen(saved)
    fill(fieldsOf(saved))
  }
  const send = async (settings: SettingValue[], version: number) => {
    if (settings.length > 0) take(await save.mutateAsync({ settings, version }))
  }
  return {
    form,
    seen,
    newer,
    hasChanges,
    sent: sent ?? [],
    problem: useMemo(() => (newerOf(save.error) ? null : byKey(save.error, sent ?? [])), [save.error, sent]),
    isBusy: save.isPending,
    isSaved: save.isSuccess && !hasChanges,
    submit: (fields: SettingsFields) => send(changedSettings(seen, fields), seen.version),
    keepMine: () => {
      if (newer && sent) void send([...sent], newer.version).catch(() => undefined)
    },
    takeTheirs: () => {
      if (newer) take(newer)
      save.reset()
    },
  }
}
