import { trimmedNumber, type SettingView } from 'shared'

const MOST_PLACES = 4

/** Between which figures a setting may lie. */
export const rangeWords = ({ minimum, maximum, unit }: SettingView): string =>
  `From ${trimmedNumber(minimum, MOST_PLACES)} to ${trimmedNumber(maximum, MOST_PLACES)} ${unit}.`
