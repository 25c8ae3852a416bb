/** Manning's constant in US units; FHWA HEC-22, 4th ed., Feb 2024, ch. 6 (its ch. 4 and TR-55 print 1.49). */
export const MANNING_K = 1.486

/** Gravity, ft/s². */
export const GRAVITY_FT_PER_S2 = 32.174
