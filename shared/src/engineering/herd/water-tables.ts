/** Gallons at rising temperatures, degrees F. */
export interface TemperatureRow {
  temperaturesF: readonly number[]
  gallons: readonly number[]
}

export const K_STATE_SOURCE = 'K-State Beef Tips, "Water: Questions and Answers" (Waggoner), 30 April 2018'
const BEEF_SOURCE = 'Beef Magazine, "Watch Summer Water", after NRC 1996 and Winchester & Morris 1956'
const MAINE_SOURCE = 'University of Maine, Pasture Management Course, lesson 7'

export const COW_WEIGHTS_LB = [1100, 1300, 1500] as const
export const COW_MILK_LB = [0, 10, 25] as const
export const COW_TEMPERATURES_F = [40, 65, 90] as const

/** Beef cow: gallons a day by weight, then milk, then temperature, in the order of the three lists above. */
export const COW_GALLONS: readonly (readonly (readonly number[])[])[] = [
  [
    [8.2, 10.8, 13.4],
    [10.5, 13.1, 15.7],
    [12.8, 15.4, 17.9],
  ],
  [
    [9.2, 11.8, 14.3],
    [12.2, 14.8, 17.4],
    [14.5, 17.1, 19.7],
  ],
  [
    [10.2, 12.7, 15.3],
    [14.0, 16.5, 19.1],
    [16.3, 18.8, 21.4],
  ],
]

export interface KindRow extends TemperatureRow {
  row: string
  source: string
  shortSource: string
}

const summer = (row: string, gallons: readonly number[]): KindRow => ({
  row,
  temperaturesF: [70, 80, 90],
  gallons,
  source: BEEF_SOURCE,
  shortSource: 'Beef Magazine',
})

/** One planning figure for all temperatures: the upper end of the printed range. */
const planning = (row: string, gallons: number): KindRow => ({
  row,
  temperaturesF: [],
  gallons: [gallons],
  source: MAINE_SOURCE,
  shortSource: 'University of Maine',
})

export const KIND_ROWS = {
  'calf-500': summer('500 lb calf', [6.5, 7.4, 10.6]),
  growing: summer('800 lb growing steer or heifer', [9.3, 10.6, 14]),
  finishing: summer('800 lb finishing animal', [10.8, 12.3, 16.5]),
  'bred-heifer': summer('750 lb bred heifer', [9, 10.3, 14.6]),
  bull: summer('mature bull', [12.7, 14.6, 19.5]),
  'dairy-cow': planning('lactating dairy cow, planning figure', 40),
  horse: planning('horse, upper end of 10 to 12', 12),
  sheep: planning('sheep, upper end of 2 to 4', 4),
  goat: planning('goat, upper end of 2 to 4', 4),
} as const satisfies Readonly<Record<string, KindRow>>
