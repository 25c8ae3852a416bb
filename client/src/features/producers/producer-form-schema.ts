import { producerInputSchema } from 'shared'
import type { z } from 'zod'
import { readSchema } from '../../components/fields/read-schema'

export type ProducerTyped = z.input<typeof producerInputSchema> & { hasAddress: boolean }

/** The tick only opens the address boxes; the server is sent a whole address or none. */
export const producerFormSchema = readSchema(
  producerInputSchema,
  ({ hasAddress, address, ...rest }: ProducerTyped) =>
    hasAddress ? { ...rest, address: address ?? {} } : rest,
)
