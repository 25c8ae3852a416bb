import { describe, expect, it } from 'vitest'
import { rimElevationFt } from './rim-elevation-ft.js'

const ramp = { stationFt: 40, elevationFt: 101, part: 'ramp' as const }
const profile = { topStationFt: 40, surface: [ramp, { ...ramp, stationFt: 80, elevationFt: 96 }] }

describe('rimElevationFt', () => {
  it('is the crest of the ground landward of the ramp, where water would have to climb over', () => {
    const groundLine = [
      { stationFt: 0, elevationFt: 99 },
      { stationFt: 20, elevationFt: 103 },
      { stationFt: 40, elevationFt: 101 },
      { stationFt: 80, elevationFt: 110 },
    ]
    expect(rimElevationFt({ profile, groundLine })).toBe(103)
  })

  it('is the ramp top itself where the land falls away behind the bank', () => {
    const groundLine = [
      { stationFt: 0, elevationFt: 95 },
      { stationFt: 40, elevationFt: 101 },
      { stationFt: 80, elevationFt: 96 },
    ]
    expect(rimElevationFt({ profile, groundLine })).toBe(101)
  })

  it('does not count ground that the approach has cut away', () => {
    const cut = {
      ...profile,
      surface: [{ stationFt: 10, elevationFt: 102, part: 'approach' as const }, ...profile.surface],
    }
    const groundLine = [
      { stationFt: 0, elevationFt: 100 },
      { stationFt: 10, elevationFt: 102 },
      { stationFt: 25, elevationFt: 109 },
      { stationFt: 80, elevationFt: 96 },
    ]
    expect(rimElevationFt({ profile: cut, groundLine })).toBe(102)
  })
})
