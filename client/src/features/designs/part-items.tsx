import { Fragment, type ComponentType } from 'react'
import { FieldGrid } from '../../components/fields/field-grid'
import { ContractedFields } from './contracted-fields'
import { FencePath } from './fence-path'
import { OptionalGroup } from './optional-group'
import type { FieldSpec, OwnSpec, PartItem } from './part-spec'
import { RollLengths } from './roll-lengths'
import { RowList } from './row-list'
import { SchedulePick } from './schedule-pick'
import { SpecField } from './spec-field'

const ownComponents: Record<OwnSpec['kind'], ComponentType<{ name: string }>> = {
  'fence-path': FencePath,
  'roll-lengths': RollLengths,
  schedule: SchedulePick,
  contracted: ContractedFields,
}

interface PartItemsProps {
  items: readonly PartItem[]
  /** Path in the plan under which the items lie. */
  under: string
  column?: number
}

/** Neighbouring fields share a grid; lists and groups stand under each other. */
function gathered(items: readonly PartItem[]): (readonly FieldSpec[] | Exclude<PartItem, FieldSpec>)[] {
  const gathers: (FieldSpec[] | Exclude<PartItem, FieldSpec>)[] = []
  for (const item of items) {
    const last = gathers.at(-1)
    if (item.kind !== 'field') gathers.push(item)
    else if (Array.isArray(last)) last.push(item)
    else gathers.push([item])
  }
  return gathers
}

/** The form of a part, or of a row in it, made from the catalogue. */
export function PartItems({ items, under, column }: PartItemsProps) {
  return gathered(items).map((item) => {
    if (isFields(item)) {
      return (
        <FieldGrid key={item[0]?.name} column={column}>
          {item.map((spec) => (
            <SpecField key={spec.name} name={`${under}.${spec.name}`} spec={spec} />
          ))}
        </FieldGrid>
      )
    }
    return <Fragment key={item.name}>{drawn(item, `${under}.${item.name}`)}</Fragment>
  })
}

const isFields = (item: readonly FieldSpec[] | PartItem): item is readonly FieldSpec[] => Array.isArray(item)

function drawn(item: Exclude<PartItem, FieldSpec>, name: string) {
  if (item.kind === 'list') return <RowList name={name} spec={item} />
  if (item.kind === 'group') return <OptionalGroup name={name} spec={item} />
  const Own = ownComponents[item.kind]
  return <Own name={name} />
}
