import { Problem } from 'shared'
import { refuseWeakPassword } from './password-rules.js'

const about = { name: 'Ines Varga', email: 'ines.varga@tansy.example' }

describe('a new password', () => {
  it.each([
    'passwordpassword1',
    'wadestone-wadestone',
    'aaaaaaaaaaaaaaaaaa',
    'ines.varga.2026!',
    'Ines Varga Ines Varga 1',
    'wadestone password 1',
  ])('is refused when it is long and still easy: %s', (password) => {
    expect(() => refuseWeakPassword(password, about)).toThrow(Problem)
  })

  it.each(['three herons stood in the reeds', 'my password is a blue tractor in the rain'])(
    'is taken when it says enough: %s',
    (password) => {
      expect(() => refuseWeakPassword(password, about)).not.toThrow()
    },
  )
})
