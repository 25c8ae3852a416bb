import { useQuery } from '@tanstack/react-query'
import { schedulesQuery } from '../api/schedules'
import { useMay } from '../api/session-context'
import { EmptyState } from '../components/feedback/empty-state'
import { QueryGate } from '../components/feedback/query-gate'
import { LinkButton } from '../components/layout/link-button'
import { Page } from '../components/layout/page'
import { ScheduleTable } from '../features/schedules/schedule-table'

export function SchedulesPage() {
  const may = useMay()
  const query = useQuery(schedulesQuery)
  const newSchedule = may('schedule:write') && <LinkButton to="/schedules/new" words="New schedule" isMain />
  return (
    <Page title="Payment schedules" action={newSchedule}>
      <QueryGate query={query}>
        {(schedules) =>
          schedules.length > 0 ? (
            <ScheduleTable schedules={schedules} />
          ) : (
            <EmptyState title="No payment schedules yet" action={newSchedule}>
              A schedule says what one fund pays in one fiscal year. A design can only name a fund whose
              schedule is in force.
            </EmptyState>
          )
        }
      </QueryGate>
    </Page>
  )
}
