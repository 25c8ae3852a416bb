import { describe, expect, it } from 'vitest'
import { deviceWords } from './device-words'

describe('deviceWords', () => {
  it.each([
    ['Mozilla/5.0 (X11; Linux x86_64) AppleWebKit/537.36 Chrome/150.0.0.0 Safari/537.36', 'Chrome on Linux'],
    [
      'Mozilla/5.0 (Windows NT 10.0) AppleWebKit/537.36 Chrome/150.0 Safari/537.36 Edg/150.0',
      'Edge on Windows',
    ],
    [
      'Mozilla/5.0 (iPad; CPU OS 17_5 like Mac OS X) AppleWebKit/605 Version/17.5 Safari/604.1',
      'Safari on iPad',
    ],
    ['Mozilla/5.0 (Android 14; Mobile; rv:140.0) Gecko/140.0 Firefox/140.0', 'Firefox on Android'],
  ])('names browser and device as a person would: %s', (userAgent, words) => {
    expect(deviceWords(userAgent)).toBe(words)
  })

  it('shows what it does not know as it stands', () => {
    expect(deviceWords('field-sync/2')).toBe('field-sync/2')
    expect(deviceWords('')).toBe('not named')
  })
})
