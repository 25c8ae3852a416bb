import { z } from 'zod'
import { plainIssues } from './plain-issues'

/**
 * The schema of a form that keeps more than is sent, such as cells just as they were typed: reads them first, then lets
 * the schema of the request decide. Errors keep their paths, so `read` must not move a field.
 */
export const readSchema = <In, Out>(schema: z.ZodType<Out>, read: (typed: In) => unknown) =>
  z.custom<In>().transform((typed, context): Out => {
    const parsed = schema.safeParse(read(typed))
    if (parsed.success) return parsed.data
    for (const { path, message } of plainIssues(parsed.error.issues)) {
      context.addIssue({ code: 'custom', path, message })
    }
    return z.NEVER
  })
