/** Range in which a rainfall and a curve number mean something; all runoff functions share it. */
export const RAINFALL_RANGE_IN = { min: 0, max: 100 } as const

/** TR-55, 2nd ed., June 1986, ch. 2: curve numbers are used between 30 and 100. */
export const CURVE_NUMBER_RANGE = { min: 30, max: 100 } as const
