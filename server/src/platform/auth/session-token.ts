import { z } from 'zod'

/** The name makes a browser insist on Secure, Path=/ and no Domain. */
export const sessionCookieName = '__Host-wadestone'
export const tokenAudience = 'wadestone'
export const tokenAlgorithm = 'HS256'
export const tokenSeconds = 15 * 60

/** A token younger than this is not written anew. */
export const renewAfterSeconds = 60

export const tokenSchema = z.object({ sub: z.uuid(), sid: z.uuid(), iat: z.number() })
export type Token = z.infer<typeof tokenSchema>
