import Box from '@mui/material/Box'
import { signInSchema } from 'shared'
import { useSignIn } from '../../api/session'
import { Form } from '../../components/fields/form'
import { SubmitButton } from '../../components/fields/submit-button'
import { TextField } from '../../components/fields/text-field'
import { useSchemaForm } from '../../components/fields/use-schema-form'

interface SignInFormProps {
  /** Known already when the session ended under a page. */
  email?: string
  onDone: () => void
}

export function SignInForm({ email = '', onDone }: SignInFormProps) {
  const signIn = useSignIn()
  const form = useSchemaForm(signInSchema, { email, password: '' })
  return (
    <Form
      form={form}
      problem={signIn.error}
      label="Sign in"
      onSubmit={async (values) => {
        await signIn.mutateAsync(values)
        onDone()
      }}
    >
      <Box sx={{ display: 'grid', gap: 5, my: 4, maxWidth: 400 }}>
        <TextField name="email" label="E-mail" type="email" autoComplete="username" />
        <TextField name="password" label="Password" type="password" autoComplete="current-password" />
        <div>
          <SubmitButton words="Sign in" busyWords="Signing in…" />
        </div>
      </Box>
    </Form>
  )
}
