import { designPlanSchema, type DesignPart } from 'shared'
import { describe, expect, it } from 'vitest'
import { z } from 'zod'
import { lengthSpecs, pointsSpec } from './fence-path-specs'
import { designPlanParts, partCatalogue } from './part-catalogue'
import type { OwnSpec, PartItem } from './part-spec'

interface Shape {
  properties?: Record<string, Shape>
  items?: Shape
  anyOf?: Shape[]
  additionalProperties?: Shape | boolean
}

/** Every path of the schema at which a person gives something: rows as [], records as {}. */
function leaves(shape: Shape, path: string): string[] {
  if (shape.anyOf) return shape.anyOf.flatMap((branch) => leaves(branch, path))
  if (shape.items) return leaves(shape.items, `${path}[]`)
  if (shape.properties)
    return Object.entries(shape.properties).flatMap(([key, inner]) => leaves(inner, `${path}.${key}`))
  if (typeof shape.additionalProperties === 'object') return [`${path}{}`]
  return [path]
}

const ownPaths: Record<OwnSpec['kind'], (path: string) => string[]> = {
  'fence-path': (path) => fields([pointsSpec, ...lengthSpecs], path),
  'roll-lengths': (path) => [`${path}{}`],
  schedule: (path) => [path],
  contracted: (path) => [`${path}{}`],
}

const fields = (items: readonly PartItem[], under: string): string[] =>
  items.flatMap((item) => {
    const path = `${under}.${item.name}`
    if (item.kind === 'field') return [path]
    if (item.kind === 'list') return fields(item.items, `${path}[]`)
    return item.kind === 'group' ? fields(item.items, path) : ownPaths[item.kind](path)
  })

const schemaOf = (part: DesignPart): Shape =>
  z.toJSONSchema(designPlanSchema.shape[part], { io: 'input', unrepresentable: 'any' }) as Shape

describe('the catalogue of the design form', () => {
  it('has every part that a plan takes, once', () => {
    const parts = Object.keys(designPlanSchema.shape).filter((key) => key !== 'inputVersion')
    expect([...designPlanParts].sort()).toEqual(parts.sort())
  })

  it.each(partCatalogue.map((spec) => [spec.part, spec] as const))(
    'gives every figure of the part %s a field, and no field that the plan does not take',
    (part, spec) => {
      expect(fields(spec.items, part).sort()).toEqual([...new Set(leaves(schemaOf(part), part))].sort())
    },
  )
})
