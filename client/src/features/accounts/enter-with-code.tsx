import Box from '@mui/material/Box'
import Button from '@mui/material/Button'
import Typography from '@mui/material/Typography'
import { enterCodeSchema, openLinkSchema, type SessionView } from 'shared'
import { useTranslation } from 'react-i18next'
import { useEnterCode, useOpenLink } from '../../api/session'
import { EmptyState } from '../../components/feedback/empty-state'
import { ProblemAlert } from '../../components/feedback/problem-alert'
import { Form } from '../../components/fields/form'
import { SubmitButton } from '../../components/fields/submit-button'
import { TextField } from '../../components/fields/text-field'
import { useSchemaForm } from '../../components/fields/use-schema-form'

interface EnterWithCodeProps {
  token: string
  onEntered: (session: SessionView) => void
}

/** Two steps: ask for the code, type it. Opening the page alone changes nothing, since mail filters open links too. */
export function EnterWithCode({ token, onEntered }: EnterWithCodeProps) {
  const { t } = useTranslation()
  const openLink = useOpenLink()
  if (!openLinkSchema.safeParse({ token }).success) {
    return <EmptyState title={t('enter.noLink')}>{t('enter.noLinkHow')}</EmptyState>
  }
  const send = () => {
    if (!openLink.isPending) openLink.mutate({ token })
  }
  const sentTo = openLink.data?.emailHint
  return (
    <Box sx={{ maxWidth: 480 }}>
      <Typography>{t('enter.intro')}</Typography>
      <ProblemAlert error={openLink.error} />
      <Box sx={{ my: 4 }}>
        <Button
          variant={sentTo === undefined ? 'contained' : 'text'}
          color={sentTo === undefined ? 'primary' : 'inherit'}
          aria-disabled={openLink.isPending}
          onClick={send}
        >
          {openLink.isPending
            ? t('enter.sending')
            : sentTo === undefined
              ? t('enter.send')
              : t('enter.again')}
        </Button>
      </Box>
      <Typography role="status">{sentTo !== undefined && t('enter.sent', { emailHint: sentTo })}</Typography>
      {sentTo !== undefined && <CodeForm token={token} onEntered={onEntered} />}
    </Box>
  )
}

function CodeForm({ token, onEntered }: EnterWithCodeProps) {
  const { t } = useTranslation()
  const enterCode = useEnterCode()
  const form = useSchemaForm(enterCodeSchema, { token, code: '' })
  return (
    <Form
      form={form}
      problem={enterCode.error}
      onSubmit={async (values) => onEntered(await enterCode.mutateAsync(values))}
    >
      <Box sx={{ display: 'grid', gap: 5, my: 4 }}>
        <TextField
          name="code"
          label={t('enter.code')}
          hint={t('enter.codeHint')}
          inputMode="numeric"
          autoComplete="one-time-code"
        />
        <div>
          <SubmitButton words={t('enter.open')} busyWords={t('enter.opening')} />
        </div>
      </Box>
    </Form>
  )
}
