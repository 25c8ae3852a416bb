import { describe, expect, it } from 'vitest'
import { earthworkInput, groundLine, profileInput } from '../../../examples/constructed-ramp.js'
import { balancedTopStationFt } from './balanced-top-station-ft.js'
import { rampEarthwork } from './ramp-earthwork.js'
import { rampProfile } from './ramp-profile.js'

describe('balancedTopStationFt', () => {
  it('finds a top at which dry cut · (1 − shrink) is the fill', () => {
    const station = balancedTopStationFt({
      profile: profileInput,
      earthwork: earthworkInput,
      shrinkPercent: 10,
    })
    const profile = rampProfile({ ...profileInput, rampTopStationFt: station })
    const { dryCutYd3, fillYd3 } = rampEarthwork({ groundLine, profile, ...earthworkInput }).total.prismoidal
    expect(station).toBeGreaterThan(0)
    expect(station).toBeLessThan(49)
    expect(fillYd3).toBeGreaterThan(0)
    expect(fillYd3).toBeCloseTo(dryCutYd3 * 0.9, 3)
  })

  it('moves landward when the earth shrinks more', () => {
    const at = (shrinkPercent: number) =>
      balancedTopStationFt({ profile: profileInput, earthwork: earthworkInput, shrinkPercent }) ?? NaN
    expect(at(30)).toBeLessThan(at(0))
  })

  it('gives nothing where every station on the survey wants more fill', () => {
    const cliff = [
      { stationFt: 0, elevationFt: 101.6 },
      { stationFt: 3, elevationFt: 101.5 },
      { stationFt: 6, elevationFt: 85 },
      { stationFt: 300, elevationFt: 85 },
    ]
    const profile = { ...profileInput, groundLine: cliff }
    expect(balancedTopStationFt({ profile, earthwork: earthworkInput, shrinkPercent: 10 })).toBeUndefined()
  })

  it.each([-1, 100, NaN])('refuses a shrink of %d percent', (shrinkPercent) => {
    expect(() =>
      balancedTopStationFt({ profile: profileInput, earthwork: earthworkInput, shrinkPercent }),
    ).toThrow(expect.objectContaining({ field: 'shrinkPercent' }))
  })

  it('passes on an input that is wrong at every station', () => {
    const earthwork = { ...earthworkInput, widthFt: 0 }
    expect(() => balancedTopStationFt({ profile: profileInput, earthwork, shrinkPercent: 10 })).toThrow(
      expect.objectContaining({ field: 'widthFt' }),
    )
  })
})
