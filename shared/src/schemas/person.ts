import { z } from 'zod'
import { roles } from '../workflow/roles.js'
import { emailSchema, lineOfText, moneySchema, numberBetween } from './primitives.js'

/** How far a person may check a design. Empty means: no limit was set, so nothing is covered. */
export const approvalLimitsSchema = z.strictObject({
  maximumHead: numberBetween(0, 100000, 'head'),
  maximumDrainageAcres: numberBetween(0, 100000, 'acres'),
  maximumFillHeightFt: numberBetween(0, 100, 'ft'),
  maximumCost: moneySchema,
})

export const personInputSchema = z.strictObject({
  name: lineOfText(120),
  email: emailSchema,
  roles: z.array(z.enum(roles)).min(1).max(roles.length),
  approvalLimits: approvalLimitsSchema.nullable(),
})

export const addressSchema = z.strictObject({
  street: lineOfText(120),
  town: lineOfText(80),
  region: lineOfText(40),
  postalCode: lineOfText(20),
})

export const producerInputSchema = z.strictObject({
  name: lineOfText(120),
  farmName: lineOfText(120),
  email: emailSchema.optional(),
  phone: lineOfText(30).optional(),
  address: addressSchema.optional(),
})

export type ApprovalLimits = z.infer<typeof approvalLimitsSchema>
export type PersonInput = z.infer<typeof personInputSchema>
export type ProducerInput = z.infer<typeof producerInputSchema>

export interface PersonView extends PersonInput {
  id: string
  isActive: boolean
}

export interface ProducerView extends ProducerInput {
  id: string
  personId: string | null
}
