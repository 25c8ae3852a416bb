import { useNavigate } from 'react-router-dom'
import { Page } from '../components/layout/page'
import { NewScheduleForm } from '../features/schedules/new-schedule-form'

export function NewSchedulePage() {
  const navigate = useNavigate()
  return (
    <Page title="New payment schedule" maxWidth={1080}>
      <NewScheduleForm onMade={(schedule) => void navigate(`/schedules/${schedule.id}`)} />
    </Page>
  )
}
