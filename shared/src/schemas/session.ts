import { z } from 'zod'
import type { Role } from '../workflow/roles.js'
import { emailSchema, idSchema, typedSecret } from './primitives.js'

const passwordSchema = typedSecret(15, 'Use at least 15 characters; a sentence you can remember is good')

export const signInSchema = z.strictObject({
  email: emailSchema,
  password: typedSecret(1, 'Type your password'),
})

export const changePasswordSchema = z.strictObject({
  currentPassword: typedSecret(1, 'Type the password you use now'),
  newPassword: passwordSchema,
})

export const chooseDistrictSchema = z.strictObject({ districtId: idSchema })

/** The landowner's way in: the secret of a mailed link, then the code mailed on request. */
export const openLinkSchema = z.strictObject({ token: z.string().regex(/^[A-Za-z0-9_-]{43}$/) })
export const enterCodeSchema = z.strictObject({
  token: z.string().regex(/^[A-Za-z0-9_-]{43}$/),
  code: z.string().regex(/^\d{6}$/, 'The code has six digits'),
})

export interface DistrictMembership {
  districtId: string
  districtName: string
  roles: Role[]
}

export interface SessionView {
  sessionId: string
  personId: string
  name: string
  email: string
  district: DistrictView
  roles: Role[]
  memberships: DistrictMembership[]
  /** When the landowner came by a mailed link: the one job it opens. */
  jobId: string | null
}

export interface DistrictView {
  id: string
  name: string
  timeZone: string
  isDemo: boolean
}

export interface SessionListItem {
  id: string
  startedAt: string
  lastSeenAt: string
  userAgent: string
  isThis: boolean
}
