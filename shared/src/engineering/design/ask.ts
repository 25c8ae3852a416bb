import type { DesignInput } from './design-input.js'
import type { DesignPartName } from './design-parts.js'
import type { DesignPartResults, PartValues } from './design-result.js'
import { NotReady } from './not-ready.js'
import { missingPlanSentences, type PlanPart } from './missing-plan-sentences.js'
import { settingsCatalogue, type SettingKey } from './settings-catalogue.js'
import type { SoundPlan } from './sound-plan.js'

/** How a recipe gets what it needs. Whatever is missing ends the recipe with a sentence for the person. */
export interface Ask {
  input: DesignInput
  plan: <Part extends PlanPart>(part: Part) => NonNullable<DesignInput[Part]>
  /** For what a job may do without. */
  planIfAny: <Part extends PlanPart>(part: Part) => DesignInput[Part]
  part: <Part extends DesignPartName>(part: Part) => PartValues[Part]
  partIfReady: <Part extends DesignPartName>(part: Part) => PartValues[Part] | undefined
  setting: (key: SettingKey) => number
  settingIfEntered: (key: SettingKey) => number | undefined
}

export function askOf({ sound: input, faults }: SoundPlan, done: Partial<DesignPartResults>): Ask {
  const planIfAny: Ask['planIfAny'] = (part) => {
    const fault = faults[part]
    if (fault) throw new NotReady(fault)
    return input[part]
  }
  const entered = new Map(input.settings.map(({ key, value }) => [key, value]))
  const settingIfEntered = (key: SettingKey) => entered.get(key) ?? undefined
  const partIfReady: Ask['partIfReady'] = (part) => {
    const result = done[part]
    return result?.ok ? (result.value as PartValues[typeof part]) : undefined
  }
  return {
    input,
    settingIfEntered,
    partIfReady,
    planIfAny,
    plan: (part) => {
      const value = planIfAny(part)
      if (value === undefined)
        throw new NotReady({ ok: false, field: part, message: missingPlanSentences[part] })
      return value
    },
    part: (part) => {
      if (!done[part]?.ok) throw new NotReady({ ok: false, waitingFor: [part] })
      return partIfReady(part) as PartValues[typeof part]
    },
    setting: (key) => settingIfEntered(key) ?? missingSetting(key),
  }
}

function missingSetting(key: SettingKey): never {
  const label = settingsCatalogue.find((setting) => setting.key === key)?.label ?? key
  const message = `The district setting "${label}" is still empty. An administrator can fill it in under Settings.`
  throw new NotReady({ ok: false, field: `settings.${key}`, message })
}
