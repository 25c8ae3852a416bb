export type SoilGroup = 'A' | 'B' | 'C' | 'D'

export interface CurveNumberRow {
  cover: string
  /** Hydrologic condition; absent where the table has one line for the cover. */
  condition?: 'poor' | 'fair' | 'good'
  curveNumbers: Record<SoilGroup, number>
}

const SOURCE =
  'USDA NRCS, TR-55, Urban Hydrology for Small Watersheds, 2nd ed., June 1986, table 2-2 (average runoff condition, Ia = 0.2S)'

const row = (
  cover: string,
  condition: CurveNumberRow['condition'],
  A: number,
  B: number,
  C: number,
  D: number,
): CurveNumberRow => ({ cover, ...(condition ? { condition } : {}), curveNumbers: { A, B, C, D } })

/**
 * Curve numbers by cover and hydrologic soil group. Where the table's own number is below 30 it says to use 30
 * (brush and woods in good condition, group A). Rows that could not be read in print are left out.
 *
 * Conditions: pasture poor below 50 % cover or heavily grazed without mulch, fair 50 to 75 %, good above 75 % and
 * lightly grazed; woods poor where grazing or burning destroyed the litter, fair grazed but not burned, good protected.
 */
export const curveNumberTable: { source: string; rows: readonly CurveNumberRow[] } = {
  source: SOURCE,
  rows: [
    row('Pasture, grassland or range', 'poor', 68, 79, 86, 89),
    row('Pasture, grassland or range', 'fair', 49, 69, 79, 84),
    row('Pasture, grassland or range', 'good', 39, 61, 74, 80),
    row('Meadow, not grazed, mown for hay', undefined, 30, 58, 71, 78),
    row('Brush, weeds and grass', 'poor', 48, 67, 77, 83),
    row('Brush, weeds and grass', 'fair', 35, 56, 70, 77),
    row('Brush, weeds and grass', 'good', 30, 48, 65, 73),
    row('Woods and grass, orchard', 'poor', 57, 73, 82, 86),
    row('Woods and grass, orchard', 'fair', 43, 65, 76, 82),
    row('Woods and grass, orchard', 'good', 32, 58, 72, 79),
    row('Woods', 'poor', 45, 66, 77, 83),
    row('Woods', 'fair', 36, 60, 73, 79),
    row('Woods', 'good', 30, 55, 70, 77),
    row('Farmsteads', undefined, 59, 74, 82, 86),
    row('Roads, dirt, with right of way', undefined, 72, 82, 87, 89),
    row('Roads, gravel, with right of way', undefined, 76, 85, 89, 91),
    row('Fallow, bare soil', undefined, 77, 86, 91, 94),
    row('Row crops, contoured', 'poor', 70, 79, 84, 88),
    row('Row crops, contoured', 'good', 65, 75, 82, 86),
    row('Small grain, contoured', 'poor', 63, 74, 82, 85),
    row('Small grain, contoured', 'good', 61, 73, 81, 84),
    row('Rotation meadow, contoured', 'poor', 64, 75, 83, 85),
    row('Rotation meadow, contoured', 'good', 55, 69, 78, 83),
  ],
}
