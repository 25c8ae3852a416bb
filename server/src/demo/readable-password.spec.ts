import { words } from './data/words.js'
import { readablePassword } from './readable-password.js'

describe('the password of an example person', () => {
  it('has at least twenty characters: four words of the list and six digits', () => {
    for (let tries = 0; tries < 200; tries += 1) {
      const password = readablePassword()
      expect(password.length).toBeGreaterThanOrEqual(20)
      const [digits, ...chosen] = password.split('-').reverse()
      expect(digits).toMatch(/^\d{6}$/)
      expect(chosen).toHaveLength(4)
      for (const word of chosen) expect(words).toContain(word)
    }
  })

  it('is drawn from 128 different words, so that each says seven bits', () => {
    expect(new Set(words).size).toBe(128)
  })

  it('is another one each time', () => {
    const made = Array.from({ length: 100 }, readablePassword)
    expect(new Set(made).size).toBe(100)
  })
})
