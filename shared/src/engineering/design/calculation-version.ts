/** Stored with every result. Raise it with any change that can move a figure, so that old results say how they were found. */
export const CALCULATION_VERSION = '2026-1'
