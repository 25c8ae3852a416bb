export const FT2_PER_ACRE = 43_560
export const FT3_PER_YD3 = 27
/** US gallons, 231 in³ each. */
export const GAL_PER_FT3 = 7.48052
export const IN_PER_FT = 12
