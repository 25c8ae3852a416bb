import { describe, expect, it } from 'vitest'
import { z } from 'zod'
import { readSchema } from './read-schema'

const pointSchema = z.union([
  z.strictObject({ at: z.number(), high: z.number('Give a height') }),
  z.strictObject({ at: z.number(), deep: z.number('Give a depth') }),
])
const schema = z.strictObject({
  kind: z.enum(['a', 'b']),
  count: z.number().int().min(1),
  points: z.array(pointSchema).min(1),
})
const form = readSchema<Record<string, unknown>, z.infer<typeof schema>>(schema, (typed) => ({
  ...typed,
  count: Number(typed.count),
}))

const issues = (typed: Record<string, unknown>) =>
  form.safeParse(typed).error?.issues.map(({ path, message }) => [path.join('.'), message])

describe('readSchema', () => {
  it('gives what the schema gives, from what was typed', () => {
    const typed = { kind: 'a', count: '2', points: [{ at: 1, deep: 2 }] }
    expect(form.parse(typed)).toEqual({ kind: 'a', count: 2, points: [{ at: 1, deep: 2 }] })
  })

  it('says of a choice between shapes what the one that was meant lacks, at its field', () => {
    expect(issues({ kind: 'a', count: '2', points: [{ at: 1, deep: 'x' }] })).toEqual([
      ['points.0.deep', 'Give a depth'],
    ])
  })

  it('says everything in plain words', () => {
    expect(issues({ kind: 'c', count: '0', points: [] })).toEqual([
      ['kind', 'Choose one'],
      ['count', 'Must be at least 1'],
      ['points', 'Give at least 1 of them'],
    ])
  })
})
