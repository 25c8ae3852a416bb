import type { ProducerView } from 'shared'
import type { Producer } from './producer.entity.js'

export function producerView({
  id,
  personId,
  name,
  farmName,
  email,
  phone,
  address,
}: Producer): ProducerView {
  return {
    id,
    personId,
    name,
    farmName,
    ...(email === null ? {} : { email }),
    ...(phone === null ? {} : { phone }),
    ...(address === null || address === undefined ? {} : { address }),
  }
}
