import { config } from 'zod/v4/core'

// The page forbids making code from text; zod would try it once and be reported for it.
config({ jitless: true })
