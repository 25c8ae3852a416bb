import { idSchema } from 'shared'
import { z } from 'zod'

/** Name of the queue task that makes one packet. */
export const renderPacketTask = 'render-packet'

export const renderPacketPayloadSchema = z.strictObject({ districtId: idSchema, packetId: idSchema })

export type RenderPacketPayload = z.infer<typeof renderPacketPayloadSchema>
