import type { FundingOffer } from './funding-offers.js'
import type { RulesInForce, SettingInForce } from './rules-in-force.js'

export const emptySettings = (rules: RulesInForce): SettingInForce[] =>
  rules.settings.filter(({ isNeeded, value }) => isNeeded && value === null)

export const emptySettingSentence = ({ label }: SettingInForce): string =>
  `The setting "${label}" is still empty. An administrator fills it under Settings.`

export const noCriteriaSentence = 'No criteria set is in force. An administrator puts one in force.'

/** What the district still owes this design, in whole sentences that say who can help. */
export function missingRules(rules: RulesInForce, offers: readonly FundingOffer[]): string[] {
  return [
    ...emptySettings(rules).map(emptySettingSentence),
    ...(rules.criteriaSet ? [] : [noCriteriaSentence]),
    ...(rules.costList ? [] : ['No cost list is in force. An administrator puts one in force.']),
    ...offers.flatMap(({ trouble }) => trouble ?? []),
  ]
}
