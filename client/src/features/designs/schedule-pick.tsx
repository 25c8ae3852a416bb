import { useQuery } from '@tanstack/react-query'
import { useWatch } from 'react-hook-form'
import type { ScheduleListItem } from 'shared'
import { schedulesQuery } from '../../api/schedules'
import { QueryGate } from '../../components/feedback/query-gate'
import { SelectField, type Choice } from '../../components/fields/select-field'

interface SchedulePickProps {
  name: string
}

const inForce = (schedules: readonly ScheduleListItem[]): Choice[] =>
  schedules
    .filter(({ status }) => status === 'in-force')
    .map(({ key, name, fiscalYear }) => ({ value: key, label: `${name}, fiscal year ${fiscalYear}` }))

/** A fund whose payment schedule is in force. One that no longer is stays chosen and says so. */
export function SchedulePick({ name }: SchedulePickProps) {
  const query = useQuery(schedulesQuery)
  const chosen: unknown = useWatch({ name })
  return (
    <QueryGate query={query} lines={1}>
      {(schedules) => {
        const choices = inForce(schedules)
        if (typeof chosen === 'string' && !choices.some(({ value }) => value === chosen)) {
          choices.push({ value: chosen, label: `${chosen}, not in force` })
        }
        const hint =
          choices.length === 0 ? 'No payment schedule is in force. The office puts one in force.' : undefined
        return <SelectField name={name} label="Fund" hint={hint} choices={choices} />
      }}
    </QueryGate>
  )
}
