import Typography from '@mui/material/Typography'
import { useQuery } from '@tanstack/react-query'
import { settingsQuery } from '../api/districts'
import { useMay } from '../api/session-context'
import { QueryGate } from '../components/feedback/query-gate'
import { Page } from '../components/layout/page'
import { SettingsForm } from '../features/settings/settings-form'
import { SettingsTable } from '../features/settings/settings-table'

export function SettingsPage() {
  const may = useMay()
  const query = useQuery(settingsQuery)
  return (
    <Page title="District settings" maxWidth={1080}>
      <Typography>
        Figures that no publication gives, entered by the district. Each stands with its source and the date
        of that source.
      </Typography>
      <QueryGate query={query} lines={12}>
        {(view) => (may('settings:write') ? <SettingsForm view={view} /> : <SettingsTable view={view} />)}
      </QueryGate>
    </Page>
  )
}
