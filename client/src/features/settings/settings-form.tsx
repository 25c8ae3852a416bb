import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import type { SettingsView } from 'shared'
import { LeaveGuard } from '../../components/feedback/leave-guard'
import { StaleChoice } from '../../components/feedback/stale-choice'
import { StatusLine } from '../../components/feedback/status-line'
import { Form } from '../../components/fields/form'
import { SubmitButton } from '../../components/fields/submit-button'
import { Section } from '../../components/layout/section'
import { settingDifferences } from './setting-differences'
import { settingGroups } from './setting-groups'
import { SettingRow } from './setting-row'
import { useSettingsForm } from './use-settings-form'

interface SettingsFormProps {
  view: SettingsView
}

export function SettingsForm({ view }: SettingsFormProps) {
  const settings = useSettingsForm(view)
  const { form, seen, newer, hasChanges } = settings
  const isPressed = form.formState.submitCount > 0
  const statusWords = settings.isSaved
    ? 'The settings are saved.'
    : isPressed && !hasChanges
      ? 'Nothing is changed, so nothing was saved.'
      : null
  return (
    <>
      <LeaveGuard hasUnsaved={hasChanges} />
      {newer && (
        <StaleChoice
          sentence="The settings of the district were changed."
          differences={settingDifferences(settings.sent, newer)}
          onKeepMine={settings.keepMine}
          onTakeTheirs={settings.takeTheirs}
          isBusy={settings.isBusy}
        />
      )}
      <Form form={form} problem={settings.problem} label="Settings" onSubmit={settings.submit}>
        {settingGroups(seen).map(({ title, why, settings: group }) => (
          <Section key={title} title={title} aside={group.length}>
            <Typography sx={{ mt: 2, color: 'text.secondary' }}>{why}</Typography>
            {group.map((setting) => (
              <SettingRow key={setting.key} setting={setting} />
            ))}
          </Section>
        ))}
        <Box
          sx={{
            position: 'sticky',
            bottom: 0,
            bgcolor: 'background.default',
            borderTop: 1,
            borderColor: 'text.primary',
            py: 3,
            mt: 4,
            display: 'flex',
            gap: 4,
            alignItems: 'center',
          }}
        >
          <SubmitButton words="Save the settings" busyWords="Saving…" />
          <StatusLine words={statusWords} />
        </Box>
      </Form>
    </>
  )
}
