import { describe, expect, it } from 'vitest'
import { producerFormSchema } from './producer-form-schema'

const typed = { name: 'Otto Brask', farmName: 'Brask Place' }

describe('producerFormSchema', () => {
  it('forgets an address that was begun and closed again', () => {
    const address = { street: '1 Lane', town: '', region: '', postalCode: '' }
    expect(producerFormSchema.parse({ ...typed, hasAddress: false, address })).toEqual(typed)
  })

  it('asks in plain words for every line of an address that was opened', () => {
    const { error } = producerFormSchema.safeParse({ ...typed, hasAddress: true })
    expect(error?.issues.map(({ path, message }) => [path.join('.'), message])).toEqual([
      ['address.street', 'This must not be empty'],
      ['address.town', 'This must not be empty'],
      ['address.region', 'This must not be empty'],
      ['address.postalCode', 'This must not be empty'],
    ])
  })
})
