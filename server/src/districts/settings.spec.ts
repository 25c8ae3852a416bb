import { settingsCatalogue, type SettingValue } from 'shared'
import { settingProblems } from './setting-problems'
import { settingsView } from './settings-view'

const swell = (value: number | null, key = 'swellPercent'): SettingValue => ({
  key,
  value,
  source: 'soil report',
  sourceDate: '2026-02-10',
})

describe('the settings of a district', () => {
  it('are all shown, entered or empty, in the order of the catalogue', () => {
    const { version, settings } = settingsView(3, [swell(25)])
    expect(version).toBe(3)
    expect(settings.map(({ key }) => key)).toEqual(settingsCatalogue.map(({ key }) => key))
    expect(settings.find(({ key }) => key === 'swellPercent')).toMatchObject({
      value: 25,
      source: 'soil report',
    })
    expect(settings.filter(({ value }) => value === null)).toHaveLength(settingsCatalogue.length - 1)
  })

  it('take what lies in their range, both ends with it, and an emptied one', () => {
    for (const value of [0, 100, null]) expect(settingProblems([swell(value)])).toEqual([])
  })

  it('refuse a value outside the range beside that value, and say the range', () => {
    expect(settingProblems([swell(100.5)])).toEqual([
      {
        pointer: '/settings/0/value',
        message: '"Swell of excavated earth" is 100.5; it must be from 0 to 100 %.',
      },
    ])
  })

  it('refuse a key that no setting has, even one that every object has', () => {
    const problems = settingProblems([swell(1), swell(1, 'swelPercent'), swell(1, 'constructor')])
    expect(problems.map(({ pointer }) => pointer)).toEqual(['/settings/1/key', '/settings/2/key'])
  })

  it('refuse one setting given twice', () => {
    expect(settingProblems([swell(1), swell(2)]).map(({ pointer }) => pointer)).toEqual(['/settings/1/key'])
  })
})
