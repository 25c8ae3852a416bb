import type { CostListView, CriteriaSetView } from 'shared'
import type { ScheduleInForce } from './schedule-in-force.js'

/** A setting as stored, with the words its catalogue gives it. */
export interface SettingInForce {
  key: string
  label: string
  isNeeded: boolean
  value: number | null
  source: string
  sourceDate: string
}

/** All that a district holds against a design on one civil date. */
export interface RulesInForce {
  /** The date in the district's own zone. */
  onDate: string
  criteriaSet: Pick<CriteriaSetView, 'id' | 'name' | 'criteria'> | null
  costList: Pick<CostListView, 'id' | 'name' | 'lines'> | null
  /** By the keys that the plan names; one that is not in force is missing here. */
  schedules: readonly ScheduleInForce[]
  settings: readonly SettingInForce[]
}
