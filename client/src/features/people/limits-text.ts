import { moneyText, numberText, type ApprovalLimits } from 'shared'

/** How far a person may check designs, in one line. */
export const limitsText = (limits: ApprovalLimits | null): string =>
  limits === null
    ? 'checks no designs'
    : [
        `${numberText(limits.maximumHead)} head`,
        `${numberText(limits.maximumDrainageAcres, 1)} acres drained`,
        `${numberText(limits.maximumFillHeightFt, 1)} ft of fill`,
        moneyText(limits.maximumCost),
      ].join(', ')
