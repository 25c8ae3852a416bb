import { idSchema } from 'shared'
import { z } from 'zod'

/** Name of the queue task that sends one message. */
export const sendMailTask = 'send-mail'

export const sendMailPayloadSchema = z.strictObject({ districtId: idSchema, mailId: idSchema })

export type SendMailPayload = z.infer<typeof sendMailPayloadSchema>
