import type { PipeTransform } from '@nestjs/common'
import { Problem, type FieldProblem } from 'shared'
import type { z } from 'zod'

type Issue = z.core.$ZodIssue

const segment = (key: PropertyKey): string => `/${String(key).replaceAll('~', '~0').replaceAll('/', '~1')}`
const pointerTo = (path: readonly PropertyKey[]): string => path.map(segment).join('')

function fieldsOf(issue: Issue): FieldProblem[] {
  if (issue.code === 'unrecognized_keys') {
    return issue.keys.map((key) => ({
      pointer: pointerTo([...issue.path, key]),
      message: 'There is no such field here. Leave it out.',
    }))
  }
  return [{ pointer: pointerTo(issue.path), message: issue.message }]
}

/** Takes a body or query through the schema that the client's form uses too. */
export function parsedBy<Output>(schema: z.ZodType<Output>): PipeTransform<unknown, Output> {
  return {
    transform(value) {
      const parsed = schema.safeParse(value ?? {})
      if (parsed.success) return parsed.data
      const fields = parsed.error.issues.flatMap(fieldsOf)
      throw new Problem('invalid-fields', { fields, detail: fields.map(({ message }) => message)[0] ?? '' })
    },
  }
}
