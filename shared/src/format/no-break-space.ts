/** Keeps a number and its unit on one line. */
export const noBreakSpace = '\u00a0'
