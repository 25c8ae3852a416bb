import { EngineeringInputError } from '../engineering-input-error.js'
import { requireNumber } from '../require-number.js'

export interface RampWidthRule {
  baseFt: number
  perHeadFt: number
  rounding: 'none' | 'up-to-foot'
  minimumFt: number
  maximumFt: number
}

export interface RampWidthInput {
  headCount: number
  rule?: RampWidthRule
}

export interface RampWidth {
  widthFt: number
  /** What the rule asks for before its limits; beyond `maximumFt` the herd wants a second access. */
  ruleFt: number
  limitedBy?: 'minimum' | 'maximum'
}

/** 10 ft + 1 ft per 10 head, built 10 to 80 ft wide. */
export const DEFAULT_RAMP_WIDTH_RULE: RampWidthRule = {
  baseFt: 10,
  perHeadFt: 0.1,
  rounding: 'none',
  minimumFt: 10,
  maximumFt: 80,
}

const ROUNDING: Readonly<Record<RampWidthRule['rounding'], (feet: number) => number>> = {
  none: (feet) => feet,
  // 10 + 0.1 · 70 is a hair over 17 in floats and must stay 17.
  'up-to-foot': (feet) => Math.ceil(feet - 1e-9),
}

/**
 * Width of the ramp for the herd, with the figure before the limits beside it.
 * See rampWidthFt for formula, fields and source.
 */
export function rampWidth({ headCount, rule = DEFAULT_RAMP_WIDTH_RULE }: RampWidthInput): RampWidth {
  const head = requireNumber({ field: 'headCount', value: headCount, min: 1, integer: true })
  const baseFt = requireNumber({ field: 'rule.baseFt', value: rule.baseFt, min: 0 })
  const perHeadFt = requireNumber({ field: 'rule.perHeadFt', value: rule.perHeadFt, min: 0 })
  const minimumFt = requireNumber({ field: 'rule.minimumFt', value: rule.minimumFt, exclusiveMin: 0 })
  const maximumFt = requireNumber({ field: 'rule.maximumFt', value: rule.maximumFt, min: minimumFt })
  const round = ROUNDING[rule.rounding]
  if (round === undefined) {
    throw new EngineeringInputError({
      field: 'rule.rounding',
      message: `rule.rounding is "${rule.rounding}"; it must be none or up-to-foot.`,
    })
  }
  const ruleFt = round(baseFt + perHeadFt * head)
  if (ruleFt > maximumFt) return { widthFt: maximumFt, ruleFt, limitedBy: 'maximum' }
  if (ruleFt < minimumFt) return { widthFt: minimumFt, ruleFt, limitedBy: 'minimum' }
  return { widthFt: ruleFt, ruleFt }
}
