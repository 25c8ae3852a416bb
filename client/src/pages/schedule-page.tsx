import { useQuery } from '@tanstack/react-query'
import { useParams } from 'react-router-dom'
import { scheduleQuery } from '../api/schedules'
import { useMay } from '../api/session-context'
import { QueryGate } from '../components/feedback/query-gate'
import { Page } from '../components/layout/page'
import { TextLink } from '../components/layout/text-link'
import { MappingForm } from '../features/schedules/mapping-form'
import { ScheduleFacts } from '../features/schedules/schedule-facts'
import { ScheduleLines } from '../features/schedules/schedule-lines'
import { PutScheduleInForce } from '../features/schedules/put-schedule-in-force'

export function SchedulePage() {
  const { scheduleId = '' } = useParams()
  const may = useMay()
  const query = useQuery(scheduleQuery(scheduleId))
  return (
    <QueryGate query={query}>
      {(schedule) => {
        const isOpen = schedule.status === 'draft' && may('schedule:write')
        const isMapped = isOpen && schedule.lines.length > 0
        return (
          <Page
            title={schedule.name}
            beside={`fiscal year ${schedule.fiscalYear}`}
            action={<TextLink to="/schedules">All schedules</TextLink>}
          >
            <ScheduleFacts schedule={schedule} />
            {isMapped && <MappingForm key={schedule.id} schedule={schedule} />}
            {!isMapped && schedule.lines.length > 0 && <ScheduleLines lines={schedule.lines} />}
            {isOpen && !isMapped && <PutScheduleInForce schedule={schedule} unmapped={[]} reasons={[]} />}
          </Page>
        )
      }}
    </QueryGate>
  )
}
