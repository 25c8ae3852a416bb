/**
 * Most water that the soil still takes in after runoff starts: S = 1000/CN − 10.
 *
 * @param curveNumber CN, no unit, 30 to 100; the caller has checked it.
 * @returns S in inches; 0 for CN 100.
 * Source: USDA NRCS, TR-55, Urban Hydrology for Small Watersheds, 2nd ed., June 1986, eq. 2-4.
 * @example potentialRetentionIn(75) // 3.3333
 */
export const potentialRetentionIn = (curveNumber: number): number => 1000 / curveNumber - 10
