import type { DesignPart, JobInput } from 'shared'
import type { Choice } from '../../components/fields/select-field'
import type { ResultKey } from './result-words'

export type FieldControl = 'number' | 'station' | 'text' | 'select' | 'check' | 'money'

/** One field of the plan as data: its name in the plan, what people call it, and how it is typed. */
export interface FieldSpec {
  kind: 'field'
  control: FieldControl
  name: string
  label: string
  unit?: string
  hint?: string
  choices?: readonly Choice[]
  isOptional?: boolean
}

/** Rows that can be added and taken out. */
export interface ListSpec {
  kind: 'list'
  name: string
  title: string
  /** What one row is called, such as "layer". */
  one: string
  hint?: string
  items: readonly PartItem[]
  empty: Readonly<Record<string, unknown>>
  /** The order of the rows means something, so they can be moved. */
  isOrdered?: boolean
  /** Rows of two or three short figures stand on one line each. */
  isCompact?: boolean
}

/** A part of a part that a job may do without. */
export interface GroupSpec {
  kind: 'group'
  name: string
  title: string
  hint: string
  items: readonly PartItem[]
  empty: Readonly<Record<string, unknown>>
}

/** Fields with a way of their own, drawn by a component of the same name. */
export interface OwnSpec {
  kind: 'fence-path' | 'roll-lengths' | 'schedule' | 'contracted'
  name: string
}

export type PartItem = FieldSpec | ListSpec | GroupSpec | OwnSpec

/** What is known of the job before anything is designed. */
export interface StartFacts {
  body: JobInput['body']
  waterSurfaceFt: number | undefined
}

export interface PartSpec {
  part: DesignPart
  title: string
  sentence: string
  items: readonly PartItem[]
  /** The empty part: rows to fill and what the job knows. Figures stay empty; the planner gives them. */
  start: (facts: StartFacts) => Record<string, unknown>
  results: readonly ResultKey[]
}
