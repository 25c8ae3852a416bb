import { hashPassword, isPassword } from './password-hash.js'

const pepper = 'p'.repeat(43)

describe('a password hash', () => {
  it('counts every character of 128, also the hundredth', async () => {
    const password = 'correct horse battery staple '.repeat(5).slice(0, 128)
    const other = `${password.slice(0, 99)}#${password.slice(100)}`
    const passwordHash = await hashPassword(password, pepper)
    expect(other).toHaveLength(128)
    expect(await isPassword(password, passwordHash, pepper)).toBe(true)
    expect(await isPassword(other, passwordHash, pepper)).toBe(false)
  })

  it('fits nobody who has no password', async () => {
    expect(await isPassword('', null, pepper)).toBe(false)
  })

  it('fits only with the pepper it was made with', async () => {
    const passwordHash = await hashPassword('a field book in the rain', pepper)
    expect(await isPassword('a field book in the rain', passwordHash, 'q'.repeat(43))).toBe(false)
  })
})
