import { formatFeet, moneyText, numberText, trimmedNumber, type ApprovalLimits } from 'shared'

/** How far a person may check, in one line. */
export const limitsText = (limits: ApprovalLimits | null): string =>
  limits === null
    ? 'no approval limits entered, so a check would not cover any design'
    : [
        `up to ${numberText(limits.maximumHead)} head`,
        `${trimmedNumber(limits.maximumDrainageAcres, 2)} acres draining to it`,
        `${formatFeet(limits.maximumFillHeightFt)} of fill`,
        moneyText(limits.maximumCost),
      ].join(', ')
