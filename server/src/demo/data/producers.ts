import type { ProducerInput } from 'shared'

interface Farm {
  name: string
  farmName: string
  street: string
  town: string
  postalCode: string
  /** The last four figures of a number that is never given out. */
  phone: string
}

/** Every town and region is invented, and no mail leaves for an address that ends in .example. */
export const producer = ({ name, farmName, phone, ...address }: Farm): ProducerInput => ({
  name,
  farmName,
  email: `${name.toLowerCase().replace(/[^a-z]+/g, '.')}@farm.example`,
  phone: `555-${phone}`,
  address: { ...address, region: 'Norland' },
})

/** Somebody who gets paper by post. */
export const producerByPost = (farm: Farm): ProducerInput => ({ ...producer(farm), email: undefined })
