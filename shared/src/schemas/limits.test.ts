import { describe, expect, it } from 'vitest'
import { z } from 'zod'
import * as everything from '../index.js'

interface Shape {
  type?: string
  properties?: { [key: string]: Shape }
  propertyNames?: Shape
  additionalProperties?: Shape | boolean
  items?: Shape
  prefixItems?: Shape[]
  anyOf?: Shape[]
  oneOf?: Shape[]
  allOf?: Shape[]
  minimum?: number
  maximum?: number
  maxLength?: number
  maxItems?: number
  format?: string
  pattern?: string
  const?: unknown
  enum?: unknown[]
}

const schemas = Object.entries(everything).flatMap(
  ([name, exported]: [string, unknown]): [string, z.ZodType][] =>
    exported instanceof z.ZodType ? [[name, exported]] : [],
)

const isSafeWhole = ({ minimum = 0, maximum = 0 }: Shape) =>
  minimum === Number.MIN_SAFE_INTEGER || maximum === Number.MAX_SAFE_INTEGER

/** What is wrong at this very place: something that a request could make as large as it likes. */
function boundless(shape: Shape): boolean {
  if (shape.enum !== undefined || shape.const !== undefined) return false
  if (shape.type === 'number' || shape.type === 'integer')
    return shape.minimum === undefined || shape.maximum === undefined || isSafeWhole(shape)
  if (shape.type === 'string')
    return shape.maxLength === undefined && shape.format === undefined && shape.pattern === undefined
  if (shape.type === 'array') return shape.maxItems === undefined && shape.prefixItems === undefined
  return false
}

function boundlessPlaces(shape: Shape, path: string): string[] {
  const below: [Shape | undefined, string][] = [
    ...Object.entries(shape.properties ?? {}).map(([key, inner]): [Shape, string] => [inner, `/${key}`]),
    [shape.items, '/0'],
    [shape.propertyNames, '/key'],
    [typeof shape.additionalProperties === 'object' ? shape.additionalProperties : undefined, '/value'],
    ...[shape.prefixItems, shape.anyOf, shape.oneOf].flatMap((branches) =>
      (branches ?? []).map((inner): [Shape, string] => [inner, '']),
    ),
  ]
  const own = boundless(shape) ? [path] : []
  return [...own, ...below.flatMap(([inner, step]) => (inner ? boundlessPlaces(inner, path + step) : []))]
}

const shapeOf = (schema: z.ZodType): Shape =>
  z.toJSONSchema(schema, { io: 'input', unrepresentable: 'any', reused: 'inline' }) as Shape

/** Every text inside a schema, with the rules that hold for it. */
function textsIn(schema: z.ZodType): z.ZodString[] {
  const seen = new Set<z.ZodType>()
  const found: z.ZodString[] = []
  const visit = (node: unknown) => {
    if (!(node instanceof z.ZodType) || seen.has(node)) return
    seen.add(node)
    if (node instanceof z.ZodString) found.push(node)
    for (const inner of Object.values(node.def)) {
      for (const child of Array.isArray(inner) ? inner : [inner]) visit(child)
    }
    if (node instanceof z.ZodObject) Object.values(node.shape).forEach(visit)
  }
  visit(schema)
  return found
}

describe.each(schemas)('%s', (_, schema) => {
  it('sets a limit to every text, number and list, so that no request can hold what cannot be stored', () => {
    expect(boundlessPlaces(shapeOf(schema), '')).toEqual([])
  })

  it('lets no half of a character by', () => {
    const halves = ['\ud800', `${'a'.repeat(20)}\ud800`]
    const lets = textsIn(schema).filter((text) => halves.some((half) => text.safeParse(half).success))
    expect(lets.map(({ def }) => def)).toEqual([])
  })
})
