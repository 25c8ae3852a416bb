import type { PipeTransform } from '@nestjs/common'
import { idSchema, Problem } from 'shared'

/** What is no id cannot name anything, so the answer is the same as for an unknown one. */
export const idParam: PipeTransform<unknown, string> = {
  transform(value) {
    const id = idSchema.safeParse(value)
    if (!id.success) throw new Problem('not-found')
    return id.data
  },
}
