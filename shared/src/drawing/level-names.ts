import type { DesignPlan } from '../schemas/design-plan.js'

type Body = NonNullable<DesignPlan['site']>['body']

interface LevelNames {
  high: string
  low: string
}

const standing: LevelNames = { high: 'full pool', low: 'low water' }
const running: LevelNames = { high: 'ordinary level', low: 'low flow' }

/** Running water has no pool: its ordinary level and its low flow take the places of full pool and low water. */
export const levelNames: { readonly [body in Body]: LevelNames } = {
  pond: standing,
  lake: standing,
  stream: running,
  river: running,
}

export const atSentenceStart = (text: string) => text.charAt(0).toUpperCase() + text.slice(1)
