import Box from '@mui/material/Box'
import { changePasswordSchema } from 'shared'
import { useChangePassword } from '../../api/session'
import { StatusLine } from '../../components/feedback/status-line'
import { Form } from '../../components/fields/form'
import { SubmitButton } from '../../components/fields/submit-button'
import { TextField } from '../../components/fields/text-field'
import { useSchemaForm } from '../../components/fields/use-schema-form'

export function ChangePasswordForm() {
  const change = useChangePassword()
  const form = useSchemaForm(changePasswordSchema, { currentPassword: '', newPassword: '' })
  return (
    <Form
      form={form}
      problem={change.error}
      label="Change the password"
      onSubmit={async (values) => {
        await change.mutateAsync(values)
        form.reset()
      }}
    >
      <Box sx={{ display: 'grid', gap: 5, my: 4, maxWidth: 400 }}>
        <TextField
          name="currentPassword"
          label="Password you use now"
          type="password"
          autoComplete="current-password"
        />
        <TextField
          name="newPassword"
          label="New password"
          hint="15 characters or more; a sentence you can remember is good"
          type="password"
          autoComplete="new-password"
        />
        <div>
          <SubmitButton words="Change it" busyWords="Changing…" isQuiet />
        </div>
      </Box>
      <StatusLine words={change.isSuccess ? 'The password is changed.' : null} />
    </Form>
  )
}
