import type { DesignInput } from '../design/design-input.js'
import type { DesignPartName } from '../design/design-parts.js'
import type { DesignPartResults, PartValues } from '../design/design-result.js'
import type { SettingKey } from '../design/settings-catalogue.js'

/** What the measures may look at: the input, the parts that are ready, and the district's settings. */
export interface CheckFacts {
  input: DesignInput
  /** Undefined while the part is not ready. */
  part: <Part extends DesignPartName>(name: Part) => PartValues[Part] | undefined
  setting: (key: SettingKey) => number | undefined
}

export function checkFacts(input: DesignInput, results: DesignPartResults): CheckFacts {
  const settings = new Map(input.settings.map(({ key, value }) => [key, value]))
  return {
    input,
    part: (name) => {
      const result = results[name]
      return result.ok ? (result.value as PartValues[typeof name]) : undefined
    },
    setting: (key) => settings.get(key) ?? undefined,
  }
}
